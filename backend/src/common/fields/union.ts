import type { Type as Class } from '@nestjs/common';
import { ApiExtraModels, getSchemaPath } from '@nestjs/swagger';
import type { OpenAPIObject } from '@nestjs/swagger';
import { Choice } from './choice';

/** Several shapes under one name, told apart by the word in `property`. */
export interface Union {
  readonly name: string;
  readonly property: string;
  readonly shapes: Readonly<Record<string, Class<unknown>>>;
  /** Validates to one error: the word is none of the choices. */
  readonly unknownShape: Class<unknown>;
}

const declared = new Map<string, Union>();

/** With its words given as a type argument, a shape that is missing does not compile. */
export function declareUnion<Word extends string>(
  name: string,
  property: string,
  shapes: Readonly<Record<Word, Class<unknown>>>,
): Union {
  class UnknownShape {}
  Choice(Object.keys(shapes))(UnknownShape.prototype, property);
  const union = { name, property, shapes, unknownShape: UnknownShape };
  declared.set(name, union);
  return union;
}

/** Makes the shapes of the unions, and further shapes that are only referred to, known to the OpenAPI generator. */
export function UsesUnions(unions: readonly Union[], others: readonly Class<unknown>[] = []): ClassDecorator {
  return ApiExtraModels(...unions.flatMap((union) => Object.values(union.shapes)), ...others) as ClassDecorator;
}

/** Adds every declared union to the document as a schema of its own. */
export function addUnionSchemas(document: OpenAPIObject): OpenAPIObject {
  const schemas = ((document.components ??= {}).schemas ??= {});
  for (const union of declared.values()) {
    const mapping = Object.fromEntries(
      Object.entries(union.shapes).map(([word, shape]) => [word, getSchemaPath(shape)]),
    );
    schemas[union.name] = {
      oneOf: Object.values(mapping).map(($ref) => ({ $ref })),
      discriminator: { propertyName: union.property, mapping },
    };
  }
  return document;
}
