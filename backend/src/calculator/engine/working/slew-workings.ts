import { slewAvailable } from '../report/derived';
import { fullLabel } from '../report/facts';
import { setFrequency } from '../text/phrases';
import { bandData, derivedDatum, deviceDatum, policyDatum } from './data';
import { usedFormula } from './gbw-workings';
import { lastStep, num } from './scope';
import type { Draft, StageScope } from './scope';
import { COMMON_PRACTICE, DATASHEET_CONDITIONS, SLEW_SOURCE } from './sources';

/** Have ÷ need of a level. */
export function ratioWorking(
  scope: StageScope,
  what: {
    title: string;
    formula: string;
    have: number | null;
    need: number | null;
    unit: 'V' | 'A' | 'V/s';
    target: string;
  },
): Draft {
  const { have, need, unit } = what;
  const both = have !== null && need !== null && need !== 0;
  return {
    title: `${what.title} of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(scope, what.formula, both ? `${num(have, unit)} / ${num(need, unit)}` : '—', both ? have / need : null),
    ],
    data: [
      ...derivedDatum('have', have === null ? 'not known' : num(have, unit)),
      ...derivedDatum('need', need === null ? 'not known' : num(need, unit)),
      ...policyDatum('margin', what.target),
    ],
    validity: [DATASHEET_CONDITIONS],
    source: COMMON_PRACTICE,
  };
}

/** Slew rate of a sine. */
export function slewNeededWorking(scope: StageScope): Draft {
  const { highHz } = scope.facts.input.specification.band;
  const peak = scope.stage.analysis.outputPeakV.value;
  return {
    title: `Slew rate needed by ${fullLabel(scope.stage)} at ${setFrequency(highHz)}`,
    steps: [
      lastStep(
        scope,
        '2π·f·V peak',
        peak === null ? '—' : `2π · ${num(highHz, 'Hz')} · ${num(peak, 'V')}`,
        peak === null ? null : 2 * Math.PI * highHz * peak,
      ),
    ],
    data: [...bandData(scope.facts), ...derivedDatum('output level', peak === null ? 'not known' : num(peak, 'V'))],
    assumptions: ['A sine of the largest level at the top of the band, ideal gain.'],
    source: SLEW_SOURCE,
  };
}

/** The device's slew rate as judged. */
export function slewAvailableWorking(scope: StageScope): Draft {
  const used = scope.stage.analysis.slewAvailable;
  const title = `Slew rate of ${fullLabel(scope.stage)}`;
  if (!used) return { title, steps: [lastStep(scope, 'not known', '—', null)], data: [], source: SLEW_SOURCE };
  const { formula, substituted } = usedFormula(used, 'slew rate', 'V/s');
  return {
    title,
    steps: [lastStep(scope, formula, substituted, used.value)],
    data: [
      ...deviceDatum(scope.stage, 'slew rate', used, 'V/s'),
      ...(used.basis === 'typ-derated' ? policyDatum('slew derating', num(scope.facts.policy.slewDerating)) : []),
    ],
    assumptions:
      used.basis === 'typ-derated' ? ['The datasheet gives no minimum: typical × derating, common practice.'] : [],
    validity: [DATASHEET_CONDITIONS],
    source: COMMON_PRACTICE,
  };
}

/** Highest frequency of a full sine at this level. */
export function fullPowerWorking(scope: StageScope): Draft {
  const have = slewAvailable(scope.stage).value;
  const peak = scope.stage.analysis.outputPeakV.value;
  const both = have !== null && peak !== null && peak !== 0;
  return {
    title: `Full-power bandwidth of ${fullLabel(scope.stage)}`,
    steps: [
      lastStep(
        scope,
        'SR / (2π·V peak)',
        both ? `${num(have, 'V/s')} / (2π · ${num(peak, 'V')})` : '—',
        both ? have / (2 * Math.PI * peak) : null,
      ),
    ],
    data: [
      ...deviceDatum(scope.stage, 'slew rate', scope.stage.analysis.slewAvailable, 'V/s'),
      ...derivedDatum('output level', peak === null ? 'not known' : num(peak, 'V')),
    ],
    source: SLEW_SOURCE,
  };
}
