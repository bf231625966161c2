/** What is wrong in an answer: numbers that JSON cannot carry, and missing values without a reason. */
export function faultsOf(answer: unknown): string[] {
  const faults: string[] = [];
  walk(answer, 'answer', faults);
  return faults;
}

function walk(value: unknown, path: string, faults: string[]): void {
  if (typeof value === 'number') {
    if (!Number.isFinite(value)) faults.push(`${path} is ${value}`);
    return;
  }
  if (typeof value === 'string') {
    if (/\b(NaN|Infinity|undefined|null)\b|\[object/.test(value)) faults.push(`${path} says "${value}"`);
    return;
  }
  // Absent is fine for what may be absent: JSON drops it.
  if (typeof value !== 'object' || value === null) return;
  if (value instanceof Map) {
    for (const [key, entry] of value) walk(entry, `${path}.${String(key)}`, faults);
    return;
  }
  missingWithoutReason(value as Record<string, unknown>, path, faults);
  for (const [key, entry] of Object.entries(value)) walk(entry, `${path}.${key}`, faults);
}

/** Figures and money: null always with a reason in words. */
function missingWithoutReason(value: Record<string, unknown>, path: string, faults: string[]): void {
  for (const name of ['value', 'amountMicros']) {
    if (name in value && value[name] === null && !(typeof value.reason === 'string' && value.reason.length > 3)) {
      faults.push(`${path}.${name} is null without a reason`);
    }
  }
}
