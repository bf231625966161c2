import { type FieldError, InvalidError } from './errors';

/** Deeper than any request of this product; stops bodies built to exhaust the stack. */
const MAX_DEPTH = 24;

function refuse(path: string, code: string, message: string): never {
  const fieldError: FieldError = { path, code, message };
  throw new InvalidError([fieldError]);
}

function cleanNumber(value: number, path: string): number {
  // JSON.parse reads 1e400 as Infinity.
  if (!Number.isFinite(value)) refuse(path, 'not_finite', `${path} is too large to be a number.`);
  return value === 0 ? 0 : value;
}

/**
 * Copies parsed JSON with every −0 made 0; refuses numbers beyond the range of a double, keys that would reach a
 * prototype, and absurd depth.
 */
export function cleanJson(value: unknown, path = '', depth = 0): unknown {
  if (typeof value === 'number') return cleanNumber(value, path);
  if (value === null || typeof value !== 'object') return value;
  if (depth >= MAX_DEPTH) refuse(path.slice(0, 200), 'too_deep', 'This is nested too deeply.');
  const join = (key: string | number) => (path === '' ? String(key) : `${path}.${key}`);
  if (Array.isArray(value)) return value.map((item, index) => cleanJson(item, join(index), depth + 1));
  const copy: Record<string, unknown> = {};
  for (const [key, item] of Object.entries(value)) {
    if (key === '__proto__') refuse(join(key), 'unknown_field', `${join(key)} is not a field.`);
    copy[key] = cleanJson(item, join(key), depth + 1);
  }
  return copy;
}
