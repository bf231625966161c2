import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { isAbsent, presence, rule } from './presence';
import type { FieldOptions } from './presence';

/** All members of a union type of strings; the compiler refuses a list that is not complete. */
export function membersOf<T extends string>(members: Record<T, true>): readonly T[] {
  return Object.keys(members) as T[];
}

export interface ChoiceOptions extends FieldOptions {
  /** Name of the enumeration in openapi.json. */
  readonly name?: string;
}

/** One of a closed list of words. */
export function Choice(values: readonly string[], options: ChoiceOptions = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      enum: [...values],
      ...(options.name ? { enumName: options.name } : {}),
      required: !options.optional,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.description ? { description: options.description } : {}),
    }),
    ...presence(options),
    rule(
      'not_a_choice',
      (value) => isAbsent(value) || (typeof value === 'string' && values.includes(value)),
      `must be one of: ${values.join(', ')}`,
    ),
  );
}

export function Flag(options: FieldOptions = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: 'boolean',
      required: !options.optional,
      ...(options.description ? { description: options.description } : {}),
    }),
    ...presence(options),
    rule('not_a_boolean', (value) => isAbsent(value) || typeof value === 'boolean', 'must be true or false'),
  );
}

/** A flag in a query string: `true` or `false`; always optional. */
export function QueryFlag(description?: string): PropertyDecorator {
  return applyDecorators(
    Flag({ optional: true, description }),
    Transform(({ value }) => (value === 'true' ? true : value === 'false' ? false : value)),
  );
}
