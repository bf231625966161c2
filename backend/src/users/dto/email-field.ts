import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsEmail, MaxLength } from 'class-validator';

/** A mail address, kept in lower case: it is the name of the account. */
export function EmailField(): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ format: 'email', maxLength: 254 }),
    Transform(({ value }: { value: unknown }) => (typeof value === 'string' ? value.trim().toLowerCase() : value)),
    IsEmail({}, { message: 'must be a mail address' }),
    MaxLength(254, { message: 'must be at most 254 characters long' }),
  );
}
