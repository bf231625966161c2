import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { isAbsent, presence, rule } from './presence';
import type { FieldOptions } from './presence';

export interface TextOptions extends FieldOptions {
  readonly maximum: number;
  /** Line breaks and tabs are allowed. */
  readonly multiline?: boolean;
  /** An empty text is allowed. */
  readonly empty?: boolean;
}

// Characters that can make a line read otherwise than it is stored; right-to-left letters themselves are welcome.
const BIDI_CONTROLS = /[\u202A-\u202E\u2066-\u2069]/u;
const CONTROLS = /[\p{Cc}\p{Cs}\u2028\u2029]/u;
const CONTROLS_BUT_LINES = /(?![\n\t])[\p{Cc}\p{Cs}\u2028\u2029]/u;

const isText = (value: unknown): value is string => typeof value === 'string';
const length = (value: string): number => [...value].length;

/** Trimmed text as people write it: any script, emoji, markup as plain characters; no control characters. */
export function Text(options: TextOptions): PropertyDecorator {
  const controls = options.multiline ? CONTROLS_BUT_LINES : CONTROLS;
  const minimum = options.empty ? 0 : 1;
  return applyDecorators(
    ApiProperty({
      type: 'string',
      minLength: minimum,
      maxLength: options.maximum,
      required: !options.optional,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.description ? { description: options.description } : {}),
    }),
    Transform(({ value }) => (isText(value) ? value.replace(/\r\n?/g, '\n').trim().normalize('NFC') : value)),
    ...presence(options),
    rule('not_text', (value) => isAbsent(value) || isText(value), 'must be text'),
    rule('required', (value) => !isText(value) || length(value) >= minimum, 'is required'),
    rule(
      'too_long',
      (value) => !isText(value) || length(value) <= options.maximum,
      `must be at most ${options.maximum} characters long`,
    ),
    rule(
      'control_character',
      (value) => !isText(value) || !controls.test(value),
      'must not contain control characters',
    ),
    rule(
      'control_character_bidi',
      (value) => !isText(value) || !BIDI_CONTROLS.test(value),
      'must not contain characters that reorder the text around them',
    ),
  );
}

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[1-8][0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/i;

export const isUuid = (value: unknown): value is string => isText(value) && UUID.test(value);

export function Uuid(options: FieldOptions = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: 'string',
      format: 'uuid',
      required: !options.optional,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.description ? { description: options.description } : {}),
    }),
    ...presence(options),
    rule('not_an_id', (value) => isAbsent(value) || isUuid(value), 'must be an identifier (UUID)'),
  );
}

/** ISO 4217 by shape: three capital letters. */
/** ISO 4217 as the runtime knows it. */
const CURRENCIES: ReadonlySet<unknown> = new Set(Intl.supportedValuesOf('currency'));

export function Currency(options: FieldOptions = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: 'string',
      pattern: '^[A-Z]{3}$',
      example: 'USD',
      required: !options.optional,
      description: options.description ?? 'ISO 4217',
    }),
    ...presence(options),
    rule(
      'not_a_currency',
      (value) => isAbsent(value) || CURRENCIES.has(value),
      'must be an ISO 4217 currency code of three capital letters, such as USD',
    ),
  );
}

/** A plain date, YYYY-MM-DD. */
export function PlainDate(options: FieldOptions = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      type: 'string',
      format: 'date',
      required: !options.optional,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.description ? { description: options.description } : {}),
    }),
    ...presence(options),
    rule('not_a_date', (value) => isAbsent(value) || isPlainDate(value), 'must be a date such as 2026-03-31'),
  );
}

function isPlainDate(value: unknown): boolean {
  if (!isText(value) || !/^\d{4}-\d{2}-\d{2}$/.test(value)) return false;
  const date = new Date(`${value}T00:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(value);
}
