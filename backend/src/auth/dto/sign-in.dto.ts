import { ApiProperty } from '@nestjs/swagger';
import { IsString, MaxLength, MinLength } from 'class-validator';
import { Text, Uuid } from '../../common/fields/text';
import { TEXT_LIMITS } from '../../common/limits';
import { EmailField } from '../../users/dto/email-field';
import { NewPasswordField, PASSWORD_MAX_LENGTH } from '../../users/dto/password-field';

export class SignInDto {
  /** Not checked for being a mail address: what is none simply has no account. */
  @ApiProperty({ maxLength: 254 })
  @IsString({ message: 'must be text' })
  @MinLength(1, { message: 'is required' })
  @MaxLength(254, { message: 'must be at most 254 characters long' })
  email: string;

  @ApiProperty({ maxLength: PASSWORD_MAX_LENGTH })
  @IsString({ message: 'must be text' })
  @MinLength(1, { message: 'is required' })
  @MaxLength(PASSWORD_MAX_LENGTH, { message: `must be at most ${PASSWORD_MAX_LENGTH} characters long` })
  password: string;
}

export class DemoSignInDto {
  @Uuid()
  userId: string;
}

export class SetupDto {
  @ApiProperty({ description: 'SETUP_TOKEN, or the token that the server printed at its start' })
  @IsString({ message: 'must be text' })
  @MinLength(1, { message: 'is required' })
  @MaxLength(500, { message: 'must be at most 500 characters long' })
  token: string;

  @Text({ maximum: TEXT_LIMITS.name })
  name: string;

  @EmailField()
  email: string;

  @NewPasswordField()
  password: string;
}

export class ChoosePasswordDto {
  @NewPasswordField()
  password: string;
}
