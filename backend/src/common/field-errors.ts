import type { ValidationError } from 'class-validator';
import type { FieldError } from './errors';

/** class-validator's constraint names → the stable codes of the API. A decorator's `context: { code }` wins. */
const CODE_BY_CONSTRAINT: Readonly<Record<string, string>> = {
  whitelistValidation: 'unknown_field',
  isDefined: 'required',
  isNotEmpty: 'required',
  isString: 'not_text',
  isNumber: 'not_a_number',
  isInt: 'not_an_integer',
  isBoolean: 'not_a_boolean',
  isArray: 'not_a_list',
  isObject: 'not_an_object',
  nestedValidation: 'not_an_object',
  isEnum: 'not_allowed',
  isIn: 'not_allowed',
  isUuid: 'not_an_id',
  isEmail: 'not_an_email',
  isDateString: 'not_a_date',
  isIso8601: 'not_a_date',
  min: 'out_of_range',
  max: 'out_of_range',
  isPositive: 'out_of_range',
  arrayMinSize: 'too_few',
  arrayMaxSize: 'too_many',
  arrayNotEmpty: 'too_few',
  arrayUnique: 'repeated',
  minLength: 'too_short',
  maxLength: 'too_long',
  matches: 'wrong_format',
};

function lengthCode(value: unknown, message: string): string {
  return typeof value === 'string' && message.includes('longer') ? 'too_short' : 'too_long';
}

function codeOf(error: ValidationError, constraint: string, message: string): string {
  const context = error.contexts?.[constraint] as { code?: string } | undefined;
  if (context?.code !== undefined) return context.code;
  if ((error.value === undefined || error.value === null) && constraint !== 'whitelistValidation') return 'required';
  if (constraint === 'isLength') return lengthCode(error.value, message);
  return CODE_BY_CONSTRAINT[constraint] ?? 'invalid';
}

function messageOf(error: ValidationError, constraint: string, message: string): string {
  if (constraint === 'whitelistValidation') return 'is no field of this request';
  const isAbsent = error.value === undefined || error.value === null;
  return isAbsent && error.contexts?.[constraint] === undefined ? 'is required' : message;
}

/** The reason that explains most comes first: "required" and "not a number" before "out of range". */
const WEIGHT = ['unknown_field', 'required', 'not_a_number', 'not_an_integer', 'not_text', 'not_an_object'];

function weightOf(code: string): number {
  const index = WEIGHT.indexOf(code);
  return index < 0 ? WEIGHT.length : index;
}

function ownError(error: ValidationError, path: string): FieldError[] {
  const candidates = Object.entries(error.constraints ?? {}).map(([constraint, message]) => ({
    path,
    code: codeOf(error, constraint, message),
    message: messageOf(error, constraint, message),
  }));
  candidates.sort((a, b) => weightOf(a.code) - weightOf(b.code));
  return candidates.slice(0, 1);
}

/** Flattens class-validator's tree to one error a field, with paths like `stages.0.feedbackOhm`. */
export function toFieldErrors(errors: readonly ValidationError[], parent = ''): FieldError[] {
  return errors.flatMap((error) => {
    const path = parent === '' ? error.property : `${parent}.${error.property}`;
    const own = ownError(error, path);
    // What is no list at all has no entries that could be named.
    const children = own[0]?.code === 'not_a_list' ? [] : (error.children ?? []);
    return [...own, ...toFieldErrors(children, path)];
  });
}
