import { ValidateBy, ValidateIf } from 'class-validator';
import type { ValidationOptions } from 'class-validator';

/** How a field may be left out. Neither: it must be there and not null. */
export interface FieldOptions {
  readonly description?: string;
  /** The key may be absent (null is refused unless `nullable`). */
  readonly optional?: boolean;
  readonly nullable?: boolean;
}

/** Validation options that carry the stable error code of a broken rule. */
export function withCode(code: string): ValidationOptions {
  return { context: { code } };
}

/** A rule of its own with its stable code. */
export function rule(
  code: string,
  validate: (value: unknown, object: object) => boolean,
  message: string,
): PropertyDecorator {
  return ValidateBy(
    {
      name: code,
      validator: {
        validate: (value: unknown, args) => validate(value, args?.object ?? {}),
        defaultMessage: () => message,
      },
    },
    withCode(code),
  );
}

export function presence({ optional, nullable }: FieldOptions): PropertyDecorator[] {
  const decorators: PropertyDecorator[] = [];
  if (optional) decorators.push(ValidateIf((_object, value) => value !== undefined));
  else decorators.push(rule('required', (value) => value !== undefined && value !== null, 'is required'));
  if (nullable) decorators.push(ValidateIf((_object, value) => value !== null));
  return decorators;
}

/** Type rules stay silent about an absent value, so that one slip gives one message. */
export const isAbsent = (value: unknown): boolean => value === undefined;
