import { applyDecorators } from '@nestjs/common';
import type { Type as Class } from '@nestjs/common';
import { ApiProperty, ApiSchema, getSchemaPath } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { ValidateNested } from 'class-validator';
import type { DatasheetValue } from '../../calculator/engine';
import { isAbsent, presence, rule } from '../../common/fields/presence';
import type { FieldOptions } from '../../common/fields/presence';
import { limitSchema, withinLimit } from '../../common/fields/quantity';
import { Text } from '../../common/fields/text';
import { LIMITS, TEXT_LIMITS } from '../../common/limits';
import type { LimitName } from '../../common/limits';

const COLUMNS = ['min', 'typ', 'max'] as const;
type Column = (typeof COLUMNS)[number];

/** A datasheet value; the unit and the limits stand at the property that holds it. */
@ApiSchema({ name: 'DatasheetValue' })
export class DatasheetValueDto implements DatasheetValue {
  @ApiProperty({ required: false }) readonly min?: number;
  @ApiProperty({ required: false }) readonly typ?: number;
  @ApiProperty({ required: false }) readonly max?: number;

  @Text({ maximum: TEXT_LIMITS.shortText, optional: true, description: 'Test condition in the words of the datasheet' })
  readonly condition?: string;

  @Text({ maximum: TEXT_LIMITS.page, optional: true, description: 'Page of the datasheet' })
  readonly page?: string;
}

function notAbove(code: string, column: Column, other: Column): PropertyDecorator {
  const holds = (value: unknown, object: object): boolean => {
    const bound = (object as DatasheetValue)[other];
    return typeof value !== 'number' || typeof bound !== 'number' || value <= bound;
  };
  return rule(code, holds, `${column} must not be above ${other}`);
}

const orderRules: Readonly<Record<Column, PropertyDecorator[]>> = {
  min: [notAbove('min_above_typ', 'min', 'typ'), notAbove('min_above_max', 'min', 'max')],
  typ: [notAbove('typ_above_max', 'typ', 'max')],
  max: [],
};

const shapes = new Map<LimitName, Class<DatasheetValueDto>>();

/** The shape of a datasheet value whose columns keep to the named limit. */
function shapeFor(name: LimitName): Class<DatasheetValueDto> {
  const known = shapes.get(name);
  if (known) return known;
  class LimitedValue extends DatasheetValueDto {}
  for (const column of COLUMNS) {
    const decorators = [...presence({ optional: true }), ...withinLimit(LIMITS[name]), ...orderRules[column]];
    for (const decorator of decorators) decorator(LimitedValue.prototype, column);
  }
  shapes.set(name, LimitedValue);
  return LimitedValue;
}

const isObject = (value: unknown): value is object =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** A value with min, typ, max, condition and page, its columns within the named limit. */
export function DatasheetQuantity(name: LimitName, options: FieldOptions = { optional: true }): PropertyDecorator {
  return applyDecorators(
    ApiProperty({
      allOf: [{ $ref: getSchemaPath(DatasheetValueDto) }],
      ...limitSchema(name),
      required: !options.optional,
      ...(options.description ? { description: options.description } : {}),
    }),
    ...presence(options),
    rule('not_an_object', (value) => isAbsent(value) || isObject(value), 'must be an object with min, typ or max'),
    rule(
      'required',
      (value) => !isObject(value) || COLUMNS.some((column) => (value as DatasheetValue)[column] !== undefined),
      'needs at least one of min, typ and max',
    ),
    ValidateNested(),
    Type(() => shapeFor(name)),
  );
}
