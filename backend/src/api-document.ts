import type { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { ErrorDto } from './common/error.dto';
import { addUnionSchemas } from './common/fields/union';

const METHODS = ['get', 'post', 'put', 'patch', 'delete'] as const;
const ERROR_RESPONSE = {
  description: 'Any error',
  content: { 'application/json': { schema: { $ref: '#/components/schemas/ErrorDto' } } },
};

/** `UsersController.findAll` → `usersFindAll`. */
function operationId(controller: string, method: string): string {
  const feature = controller.replace(/Controller$/, '');
  return `${feature.charAt(0).toLowerCase()}${feature.slice(1)}${method.charAt(0).toUpperCase()}${method.slice(1)}`;
}

function sortedByKey<T>(record: Readonly<Record<string, T>>): Record<string, T> {
  return Object.fromEntries(Object.entries(record).sort(([a], [b]) => (a < b ? -1 : 1)));
}

/** The OpenAPI document; the same text whatever the order in which modules were loaded. */
export function createApiDocument(app: NestExpressApplication): OpenAPIObject {
  const description = 'Writing requests need the header X-Requested-With: bandledger and the session cookie.';
  const base = new DocumentBuilder().setTitle('Bandledger').setDescription(description).setVersion('1').build();
  const document = SwaggerModule.createDocument(app, base, {
    operationIdFactory: operationId,
    extraModels: [ErrorDto],
  });
  addUnionSchemas(document);
  for (const pathItem of Object.values(document.paths)) {
    for (const method of METHODS) {
      const operation = pathItem[method];
      if (operation !== undefined) operation.responses = { ...operation.responses, default: ERROR_RESPONSE };
    }
  }
  return {
    ...document,
    paths: sortedByKey(document.paths),
    components: { ...document.components, schemas: sortedByKey(document.components?.schemas ?? {}) },
  };
}
