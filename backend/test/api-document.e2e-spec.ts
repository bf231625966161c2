import { createApiDocument } from '../src/api-document';
import { TestApp } from './create-test-app';

interface Operation {
  readonly operationId: string;
  readonly responses: Record<string, { content?: Record<string, { schema: unknown }> }>;
}

describe('the API document', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await TestApp.create();
  });
  afterAll(() => testApp.close());

  const operations = (): Operation[] =>
    Object.values(createApiDocument(testApp.app).paths).flatMap((item) => Object.values(item) as Operation[]);

  it('is the same text every time', () => {
    const [first, second] = [createApiDocument(testApp.app), createApiDocument(testApp.app)];
    expect(JSON.stringify(second)).toBe(JSON.stringify(first));
    expect(Object.keys(first.paths)).toEqual(Object.keys(first.paths).sort());
  });

  it('names each operation once, fit for an identifier', () => {
    const ids = operations().map(({ operationId }) => operationId);
    expect(ids).toEqual(expect.arrayContaining(['sessionGet', 'usersFindAll', 'setupCreate', 'healthGet']));
    expect(new Set(ids).size).toBe(ids.length);
    for (const id of ids) expect(id).toMatch(/^[a-z][A-Za-z]+$/);
  });

  it('describes the answer of each operation and the one shape of errors', () => {
    for (const { operationId, responses } of operations()) {
      const { default: error, ...successes } = responses;
      expect(error?.content?.['application/json']?.schema).toEqual({ $ref: '#/components/schemas/ErrorDto' });
      const described = Object.entries(successes).map(
        ([status, { content }]) => status === '204' || content !== undefined,
      );
      expect({ operationId, described }).toEqual({ operationId, described: [true] });
    }
  });

  it('refers to no schema that it does not hold', () => {
    const document = createApiDocument(testApp.app);
    const references = JSON.stringify(document).matchAll(/"#\/components\/schemas\/([^"]+)"/g);
    const held = Object.keys(document.components?.schemas ?? {});
    const missing = [...references]
      .map(([, name]) => name)
      .filter((name) => name === undefined || !held.includes(name));
    expect(missing).toEqual([]);
  });
});
