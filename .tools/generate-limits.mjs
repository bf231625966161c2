// Writes frontend/src/api/limits.ts from backend/openapi.json: the limits that the fields of the screens name.
// Arguments (both optional): the OpenAPI document, the file to write.
import { readFileSync, writeFileSync } from 'node:fs';
import { fromRoot } from './lib/paths.mjs';
import { limitsSource } from './lib/limits-source.mjs';

const [source = fromRoot('backend/openapi.json'), target = fromRoot('frontend/src/api/limits.ts')] =
  process.argv.slice(2);
writeFileSync(target, limitsSource(JSON.parse(readFileSync(source, 'utf8'))));
