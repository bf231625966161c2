import { ApiProperty } from '@nestjs/swagger';
import { ROLES, type Role } from '../../common/role';

export class SessionUserDto {
  @ApiProperty({ format: 'uuid' })
  id: string;

  @ApiProperty()
  name: string;

  @ApiProperty()
  email: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles: Role[];
}

export class DemoAccountDto {
  @ApiProperty({ format: 'uuid' })
  userId: string;

  @ApiProperty()
  name: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles: Role[];

  @ApiProperty({ description: 'What this person does in the invented team' })
  title: string;
}

export class SessionDto {
  @ApiProperty({ type: SessionUserDto, nullable: true })
  user: SessionUserDto | null;

  @ApiProperty()
  demo: boolean;

  @ApiProperty({ description: 'The first administrator has still to be made' })
  setupNeeded: boolean;

  @ApiProperty({ type: [DemoAccountDto] })
  demoAccounts: DemoAccountDto[];

  @ApiProperty()
  version: string;
}

export class SignedInDto {
  @ApiProperty({ type: SessionUserDto })
  user: SessionUserDto;
}

export class LinkOwnerDto {
  @ApiProperty()
  name: string;

  @ApiProperty()
  email: string;
}
