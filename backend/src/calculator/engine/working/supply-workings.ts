import { supplyCurrentFor } from '../devices/amplifier-values';
import { fullLabel } from '../report/facts';
import type { ChainFacts } from '../report/facts';
import type { Money, Working, WorkingDatum } from '../report';
import type { GbwCase } from '../types';
import { decimalAmount, formatMoney } from '../text/si-format';
import { derivedDatum, deviceDatum, specified } from './data';
import { lastStep, num } from './scope';
import type { ChainScope, Draft, StageScope } from './scope';
import { COMMON_PRACTICE, DATASHEET_CONDITIONS } from './sources';

/** Quiescent current of one amplifier or block. */
export function supplyCurrentWorking(scope: StageScope): Draft {
  const { device } = scope.stage;
  const used = device ? supplyCurrentFor(device, scope.facts.gbwCase) : null;
  const value = used?.value ?? scope.stage.analysis.supplyCurrentA.value;
  return {
    title: `Supply current of ${fullLabel(scope.stage)}`,
    steps: [lastStep(scope, 'quiescent current of one amplifier', used ? num(used.value, 'A') : '—', value)],
    data: deviceDatum(scope.stage, 'supply current', used, 'A'),
    assumptions: ['The current into the load is not counted.'],
    validity: [DATASHEET_CONDITIONS],
    source: COMMON_PRACTICE,
  };
}

/** Current × total supply. */
export function supplyPowerWorking(scope: StageScope): Draft {
  const { supply } = scope.facts.input.specification;
  const current = scope.stage.analysis.supplyCurrentA.value;
  const totalV = supply.positiveV - supply.negativeV;
  return {
    title: `Supply power of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(
        scope,
        'I · (V+ − V−)',
        current === null ? '—' : `${num(current, 'A')} · ${num(totalV, 'V')}`,
        current === null ? null : current * totalV,
      ),
    ],
    data: [
      ...derivedDatum('supply current', current === null ? 'not known' : num(current, 'A')),
      ...specified('positive rail', supply.positiveV, 'V'),
      ...specified('negative rail', supply.negativeV, 'V'),
    ],
    source: COMMON_PRACTICE,
  };
}

/** Sum of a quantity over the stages. */
export function sumWorking(scope: ChainScope, key: 'supplyCurrentA' | 'supplyPowerW'): Draft {
  const unit = key === 'supplyCurrentA' ? 'A' : 'W';
  const values = scope.facts.stages.map((stage) => stage.analysis[key].value);
  const isKnown = values.every((value) => value !== null);
  return {
    title: key === 'supplyCurrentA' ? 'Supply current of the chain' : 'Supply power of the chain',
    steps: [
      lastStep(
        scope,
        'Σ of the stages',
        isKnown ? values.map((value) => num(value ?? 0, unit)).join(' + ') || '0' : '—',
        isKnown ? values.reduce<number>((sum, value) => sum + (value ?? 0), 0) : null,
      ),
    ],
    data: scope.facts.stages.flatMap((stage, index) => {
      const value = values[index];
      return derivedDatum(fullLabel(stage), value === null ? 'not known' : num(value, unit));
    }),
    source: COMMON_PRACTICE,
  };
}

/** Price of one piece at the build quantity. */
export function unitCostWorking(facts: ChainFacts, index: number, gbwCase: GbwCase): Working {
  const stage = facts.stages[index];
  const { price, money, device } = stage.cost;
  const remark = money.amountMicros !== null && money.reason ? [money.reason] : [];
  const substituted =
    price?.breakQuantity === null || !price ? '—' : `${price.needed} needed: break from ${price.breakQuantity} pieces`;
  return moneyWorking(`Unit cost of ${fullLabel(stage)}`, gbwCase, money, {
    formula: 'price of the largest break that is not above the need',
    substituted,
    data: [
      ...specified('boards per build', facts.input.buildQuantity, 'ratio').map((datum) => ({
        ...datum,
        value: String(facts.input.buildQuantity),
        origin: 'project',
      })),
      ...(device?.quote?.breaks ?? []).map((step) => ({
        label: `from ${step.quantity}`,
        value: `${decimalAmount(step.unitPriceMicros)} ${device?.quote?.currency ?? ''}`.trim(),
        origin: `quote${device?.quote?.reference ? ` ${device.quote.reference}` : ''} for ${device?.partNumber ?? ''}`,
        assumed: false,
      })),
    ],
    assumptions: ['One package per stage; channels are not shared.', ...remark],
  });
}

/** Cost of the devices of one board. */
export function costWorking(facts: ChainFacts, gbwCase: GbwCase): Working {
  const costed = facts.cost.stages.filter((stage) => stage.price !== null);
  return moneyWorking('Cost of the chain', gbwCase, facts.cost.total, {
    formula: 'Σ of the unit costs',
    substituted:
      costed
        .map((stage) =>
          stage.money.amountMicros === null ? `${stage.label} not known` : decimalAmount(stage.money.amountMicros),
        )
        .join(' + ') || '0',
    data: costed.flatMap((stage) =>
      derivedDatum(`${stage.label} ${stage.device?.partNumber ?? ''}`.trim(), formatMoney(stage.money)),
    ),
    assumptions: ['Devices only; passive parts and the board are not counted.'],
  });
}

interface MoneyParts {
  readonly formula: string;
  readonly substituted: string;
  readonly data: readonly WorkingDatum[];
  readonly assumptions: readonly string[];
}

function moneyWorking(title: string, gbwCase: GbwCase, money: Money, parts: MoneyParts): Working {
  const result = formatMoney(money);
  return {
    title,
    gbwCase,
    result,
    steps: [{ formula: parts.formula, substituted: parts.substituted, result }],
    data: parts.data,
    assumptions: parts.assumptions,
    validity: ['The price of the quote as entered; duties, freight and scrap are not in it.'],
    source: COMMON_PRACTICE,
  };
}
