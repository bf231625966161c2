import assert from 'node:assert/strict';
import { describe, it } from 'node:test';
import { limitsSource } from '../lib/limits-source.mjs';

describe('limitsSource', () => {
  it('keeps bounds and units, in alphabetical order, and leaves the rest', () => {
    const schemas = {
      Zeta: { properties: { name: { type: 'string', maxLength: 120 }, id: { type: 'string' } } },
      Alpha: { properties: { resistanceOhm: { type: 'number', minimum: 0, maximum: 1e12, 'x-unit': 'Ω' } } },
      Empty: { properties: { id: { type: 'string' } } },
    };
    assert.equal(
      limitsSource({ components: { schemas } }),
      `// Generated from backend/openapi.json by \`npm run generate:api\`. Do not edit.
export const API_LIMITS = {
  Alpha: {
    "resistanceOhm": {"minimum":0,"maximum":1000000000000,"unit":"Ω"},
  },
  Zeta: {
    "name": {"maxLength":120},
  },
} as const;
`,
    );
  });
});
