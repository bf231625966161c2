import { applyDecorators } from '@nestjs/common';
import type { Type as Class } from '@nestjs/common';
import { ApiProperty, getSchemaPath } from '@nestjs/swagger';
import { Transform, Type, plainToInstance } from 'class-transformer';
import { ValidateNested } from 'class-validator';
import { isAbsent, presence, rule } from './presence';
import type { FieldOptions } from './presence';
import { isUuid } from './text';
import type { Union } from './union';

const isPlainObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const mustBeObject = rule('not_an_object', (value) => isAbsent(value) || isPlainObject(value), 'must be an object');

/** An object of its own shape. */
export function Nested(type: () => Class<unknown>, options: FieldOptions = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      // The generator knows a lazy type by the name that this property gives the function.
      type: () => type(),
      required: !options.optional,
      ...(options.nullable ? { nullable: true } : {}),
      ...(options.description ? { description: options.description } : {}),
    }),
    ...presence(options),
    mustBeObject,
    ValidateNested(),
    Type(type),
  );
}

export interface ListOptions extends FieldOptions {
  readonly maximum: number;
  readonly minimum?: number;
  /** Stable code when there are too many. */
  readonly tooManyCode?: string;
}

function listLengthRules(options: ListOptions): PropertyDecorator[] {
  return [
    ...presence(options),
    rule('not_a_list', (value) => isAbsent(value) || Array.isArray(value), 'must be a list'),
    rule(
      options.tooManyCode ?? 'too_many',
      (value) => !Array.isArray(value) || value.length <= options.maximum,
      `must have at most ${options.maximum} entries`,
    ),
    rule(
      'too_few',
      (value) => !Array.isArray(value) || value.length >= (options.minimum ?? 0),
      `must have at least ${options.minimum ?? 0} entries`,
    ),
  ];
}

function listRules(options: ListOptions): PropertyDecorator[] {
  return [
    ...listLengthRules(options),
    // What is no object at all is named by its index below; a list in the list would pass there.
    rule('not_an_object', (value) => !Array.isArray(value) || !value.some(Array.isArray), 'must be a list of objects'),
  ];
}

const listSchema = (options: ListOptions) => ({
  maxItems: options.maximum,
  ...(options.minimum ? { minItems: options.minimum } : {}),
  required: !options.optional,
  ...(options.description ? { description: options.description } : {}),
});

export function NestedList(type: () => Class<unknown>, options: ListOptions): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: () => type(), isArray: true, ...listSchema(options) }),
    ...listRules(options),
    ValidateNested({ each: true }),
    Type(type),
  );
}

/** An object that is one of several shapes, told apart by one of its words. */
export function NestedUnion(union: Union, options: FieldOptions = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      allOf: [{ $ref: getSchemaPath(union.name) }],
      required: !options.optional,
      ...(options.description ? { description: options.description } : {}),
    }),
    ...presence(options),
    mustBeObject,
    ValidateNested(),
    Transform(({ value }) => instanceOf(union, value)),
  );
}

export function NestedUnionList(union: Union, options: ListOptions): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: 'array', items: { $ref: getSchemaPath(union.name) }, ...listSchema(options) }),
    ...listRules(options),
    ValidateNested({ each: true }),
    Transform(({ value }) => (Array.isArray(value) ? value.map((item) => instanceOf(union, item)) : value)),
  );
}

/** The value as an instance of the shape its word names; an unknown word gives a shape that only names the choices. */
export function instanceOf(union: Union, value: unknown): unknown {
  if (!isPlainObject(value)) return value;
  const word = value[union.property];
  const shape = typeof word === 'string' && Object.hasOwn(union.shapes, word) ? union.shapes[word] : null;
  if (!shape) return plainToInstance(union.unknownShape as Class<object>, { [union.property]: word });
  return plainToInstance(shape as Class<object>, value);
}

/** A list of identifiers. */
export function IdList(options: ListOptions): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ type: 'array', items: { type: 'string', format: 'uuid' }, ...listSchema(options) }),
    ...listLengthRules(options),
    rule('not_an_id', (value) => !Array.isArray(value) || value.every(isUuid), 'must be a list of identifiers (UUID)'),
  );
}
