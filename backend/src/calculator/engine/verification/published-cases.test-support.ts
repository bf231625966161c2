import { AMPLIFIER_BANDWIDTH_CASES } from '../reference/amplifier-bandwidth-cases';
import { CASCADE_CASES } from '../reference/cascade-cases';
import { CURRENT_FEEDBACK_CASES } from '../reference/current-feedback-cases';
import { NOISE_LEVEL_CASES } from '../reference/noise-level-cases';
import { PREFERRED_NUMBER_CASES } from '../reference/preferred-number-cases';
import type { PublishedCase } from '../reference/published-case';
import { RISE_TIME_SLEW_CASES } from '../reference/rise-time-slew-cases';
import { SECOND_ORDER_LOOP_CASES } from '../reference/second-order-loop-cases';
import { TRANSIMPEDANCE_CASES } from '../reference/transimpedance-cases';

export const ALL_CASES: readonly PublishedCase[] = [
  ...AMPLIFIER_BANDWIDTH_CASES,
  ...CASCADE_CASES,
  ...CURRENT_FEEDBACK_CASES,
  ...NOISE_LEVEL_CASES,
  ...PREFERRED_NUMBER_CASES,
  ...RISE_TIME_SLEW_CASES,
  ...SECOND_ORDER_LOOP_CASES,
  ...TRANSIMPEDANCE_CASES,
];

/** What a spec does with one case: it must answer every expected figure. */
type Drive = (published: PublishedCase) => Readonly<Record<string, number>>;

/** Declares one test per case, named after its publication. */
export function holdTo(id: string, drive: Drive): void {
  const published = ALL_CASES.find((candidate) => candidate.id === id);
  if (!published) throw new Error(`no published case ${id}`);
  it(`${id} ${published.what} — ${published.source}`, () => {
    const actual = drive(published);
    expect(Object.keys(actual).sort()).toEqual(Object.keys(published.expected).sort());
    for (const [key, expected] of Object.entries(published.expected)) {
      const within = Math.abs(actual[key] - expected) <= published.tolerance[key] * (1 + 1e-9);
      expect({ key, value: actual[key], within }).toEqual({ key, value: actual[key], within: true });
    }
  });
}

export function numberInput(published: PublishedCase, name: string): number {
  const value = published.inputs[name];
  if (typeof value !== 'number') throw new Error(`${published.id} has no number ${name}`);
  return value;
}

export function listInput(published: PublishedCase, name: string): readonly number[] {
  const value = published.inputs[name];
  if (!Array.isArray(value)) throw new Error(`${published.id} has no list ${name}`);
  return value as readonly number[];
}

/** { '10': f(10), … } for a list of inputs. */
export function byInput(list: readonly number[], figure: (value: number) => number): Record<string, number> {
  return Object.fromEntries(list.map((value) => [String(value), figure(value)]));
}
