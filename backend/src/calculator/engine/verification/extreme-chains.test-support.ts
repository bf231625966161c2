import type { ChainInput, DatasheetValue } from '../types';
import { SeededRandom, randomChain } from './random-chains.test-support';

/** What the validation accepts, by the unit at the end of a name. */
const LIMITS: readonly (readonly [suffix: RegExp, low: number, high: number])[] = [
  [/Ohm$/, 1e-9, 1e15],
  [/[a-z]F$/, 1e-21, 10],
  [/Hz$/, 1e-6, 1e15],
];

/** A random chain with many of its resistances, capacitances and frequencies moved by up to fifteen powers of ten. */
export function extremeChain(seed: number): ChainInput {
  const random = new SeededRandom(seed + 777);
  const { specification, ...rest } = randomChain(seed);
  const decades = random.pick([2, 5, 15]);
  const moved = moveAll(random, decades, { ...rest, source: specification.source, load: specification.load });
  const operatingHz = random.logBetween(1e-3, 1e12);
  const band = { lowHz: operatingHz / 2, operatingHz, highHz: operatingHz * 2 };
  const { source, load, ...chain } = moved;
  return { ...chain, specification: { ...specification, source, load, band } };
}

function moveAll<T>(random: SeededRandom, decades: number, value: T): T {
  if (Array.isArray(value)) return value.map((entry) => moveAll<unknown>(random, decades, entry)) as T;
  if (typeof value !== 'object' || value === null) return value;
  const entries = Object.entries(value).map(([name, entry]: [string, unknown]) => {
    const limits = LIMITS.find(([suffix]) => suffix.test(name));
    return [name, limits ? move(random, decades, entry, limits) : moveAll(random, decades, entry)];
  });
  return Object.fromEntries(entries) as T;
}

/** All columns of a datasheet value by the same factor, so that their order stays. */
function move(random: SeededRandom, decades: number, value: unknown, [, low, high]: (typeof LIMITS)[number]): unknown {
  if (random.chance(0.5)) return value;
  const factor = 10 ** random.between(-decades, decades);
  const within = (number: number): number => (number === 0 ? 0 : Math.min(high, Math.max(low, number * factor)));
  if (typeof value === 'number') return within(value);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value as DatasheetValue).map(([column, entry]) => [column, within(entry as number)]),
  );
}
