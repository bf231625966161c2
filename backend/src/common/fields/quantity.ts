import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { LIMITS } from '../limits';
import type { Limit, LimitName } from '../limits';
import { isAbsent, presence, rule } from './presence';
import type { FieldOptions } from './presence';

const isNumber = (value: unknown): value is number => typeof value === 'number';

/** A number within the named limit, in that limit's unit. Text is never converted: "10 MHz" is refused, not guessed at. */
export function Quantity(name: LimitName, options: FieldOptions = {}): PropertyDecorator {
  const limit: Limit = LIMITS[name];
  return applyDecorators(
    ApiProperty({
      type: limit.integer ? 'integer' : 'number',
      ...limitSchema(name),
      required: !options.optional,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.description ? { description: options.description } : {}),
    }),
    ...presence(options),
    ...withinLimit(limit),
  );
}

export function limitSchema(name: LimitName): Record<string, unknown> {
  const { unit, minimum, maximum } = LIMITS[name];
  return { minimum, maximum, 'x-unit': unit, 'x-limit': name };
}

export function withinLimit(limit: Limit): PropertyDecorator[] {
  const rules = [
    rule('not_a_number', (value) => isAbsent(value) || isNumber(value), 'must be a number'),
    rule('not_finite', (value) => !isNumber(value) || Number.isFinite(value), 'must be a finite number'),
    rule(
      limit.code ?? 'out_of_range',
      (value) => !isNumber(value) || !Number.isFinite(value) || (value >= limit.minimum && value <= limit.maximum),
      `must be between ${limit.minimum} and ${limit.maximum} ${limit.unit}`,
    ),
  ];
  if (limit.integer) {
    rules.push(
      rule(
        'not_an_integer',
        (value) => !isNumber(value) || !Number.isFinite(value) || Number.isInteger(value),
        'must be a whole number',
      ),
    );
  }
  return rules;
}

/** A number in a query string, within the named limit; always optional. */
export function QueryQuantity(name: LimitName, description?: string): PropertyDecorator {
  return applyDecorators(
    Quantity(name, { optional: true, description }),
    Transform(({ value }) => numberOf(value)),
  );
}

/** The number that a query string writes; anything else stays as it is and is refused as no number. */
export function numberOf(text: unknown): unknown {
  if (typeof text !== 'string' || text.trim() === '') return text;
  const value = Number(text);
  return Number.isNaN(value) ? text : value;
}
