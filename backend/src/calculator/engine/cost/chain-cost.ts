import type { Money } from '../report';
import type { ChainInput, Device, Stage } from '../types';
import { listText } from '../text/phrases';
import { decimalAmount } from '../text/si-format';
import { countStagesByDevice, unitPrice } from './unit-price';
import type { UnitPrice } from './unit-price';

/** Price of one stage; a stage of passive parts has no device and is left out of the sum. */
export interface StageCost {
  readonly stageId: string;
  readonly label: string;
  readonly device: Device | null;
  /** Null: passive parts, not costed. */
  readonly price: UnitPrice | null;
  readonly money: Money;
}

/** Cost of the devices of one board. */
export interface ChainCost {
  readonly stages: readonly StageCost[];
  readonly total: Money;
}

/**
 * The devices of one board at the project's build quantity: need = boards × stages that use the device.
 * Sums in BigInt, so that no micro-unit is lost. Null with the reason as soon as one price is missing.
 *
 * @param input whole chain
 * @returns price by stage and their sum
 */
export function chainCost(input: ChainInput): ChainCost {
  const counts = countStagesByDevice(input.stages);
  const devices = new Map(input.devices.map((device) => [device.id, device]));
  const stages = input.stages.map((stage, index) => stageCost(stage, index, input, devices, counts));
  return { stages, total: sum(stages, input.currency) };
}

function stageCost(
  stage: Stage,
  index: number,
  input: ChainInput,
  devices: ReadonlyMap<string, Device>,
  counts: ReadonlyMap<string, number>,
): StageCost {
  const device = 'deviceId' in stage ? (devices.get(stage.deviceId) ?? null) : null;
  const base = { stageId: stage.id, label: `S${index + 1}`, device };
  if (!device) {
    return { ...base, price: null, money: none(input.currency, 'passive parts are not part of the device cost') };
  }
  const needed = input.buildQuantity * (counts.get(device.id) ?? 1);
  const price = unitPrice(device, { currency: input.currency, needed, today: input.today });
  return { ...base, price, money: price.money };
}

function sum(stages: readonly StageCost[], currency: string): Money {
  const costed = stages.filter((stage) => stage.price !== null);
  const missing = costed.filter((stage) => stage.money.amountMicros === null);
  const known = costed.filter((stage) => stage.money.amountMicros !== null);
  const totalMicros = known.reduce((total, stage) => total + BigInt(Math.round(stage.money.amountMicros ?? 0)), 0n);
  if (totalMicros > BigInt(Number.MAX_SAFE_INTEGER)) return none(currency, 'the sum is too large to be shown exactly');
  if (missing.length === 0) return { amountMicros: Number(totalMicros), currency };
  return none(currency, missingReason(missing, known.length, `${decimalAmount(Number(totalMicros))} ${currency}`));
}

function missingReason(missing: readonly StageCost[], knownCount: number, knownText: string): string {
  const stagesByReason = new Map<string, string[]>();
  for (const { label, money } of missing) {
    const reason = money.reason ?? 'no price';
    stagesByReason.set(reason, [...(stagesByReason.get(reason) ?? []), label]);
  }
  const what = [...stagesByReason].map(([reason, labels]) => `${listText(labels)}: ${reason}`).join('; ');
  return knownCount === 0 ? what : `${what} (the others sum to ${knownText})`;
}

function none(currency: string, reason: string): Money {
  return { amountMicros: null, currency, reason };
}
