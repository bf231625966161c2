import { probeChain } from '../chain/probe';
import type { ChainProbe } from '../chain/probe';
import type { Complex } from '../complex';
import type { ChainFacts, StageFacts } from '../report/facts';
import type { Figure, Unit, Working, WorkingDatum, WorkingStep } from '../report';
import { formatFigure, quantity, trimmed } from '../text/si-format';

const SUBSTITUTION_DIGITS = 5;
const ROUNDING_NOISE = 1e-9;

/** What a working is written from. */
export interface ChainScope {
  readonly facts: ChainFacts;
  readonly figure: Figure;
}

/** What the working of a stage's figure is written from. */
export interface StageScope extends ChainScope {
  readonly stage: StageFacts;
}

/** The part of a working that differs from figure to figure. */
export interface Draft {
  readonly title: string;
  readonly steps: readonly WorkingStep[];
  readonly data: readonly WorkingDatum[];
  readonly assumptions?: readonly string[];
  readonly validity?: readonly string[];
  readonly source: string;
}

/** The chain solved at one frequency in the case shown: where complex values of a working come from. */
export function probeAt(scope: ChainScope, frequencyHz: number): ChainProbe {
  return probeChain(scope.facts.input, scope.facts.gbwCase, frequencyHz);
}

/** A number inside a substitution: five digits, no trailing zeros. */
export function num(value: number, unit: Unit | null = null): string {
  return unit === null ? trimmed(value, SUBSTITUTION_DIGITS) : quantity(value, unit, SUBSTITUTION_DIGITS, 'trimmed');
}

/** A complex number inside a substitution: "3.2 − j 0.41". */
export function complexText(value: Complex): string {
  const sign = value.im < 0 ? '−' : '+';
  return `${num(value.re)} ${sign} j ${num(Math.abs(value.im))}`;
}

/** |z|. */
export function magnitude(value: Complex): number {
  return Math.hypot(value.re, value.im);
}

/** A step whose result is not the figure yet. */
export function step(formula: string, substituted: string, result: string): WorkingStep {
  return { formula, substituted, result };
}

/** The step that ends in the figure: the computed value is written with the figure's unit and digits. */
export function lastStep(
  scope: ChainScope,
  formula: string,
  substituted: string,
  computed: number | null,
): WorkingStep {
  const { figure } = scope;
  const result =
    figure.value === null || computed === null
      ? formatFigure(figure)
      : formatFigure({ ...figure, value: figure.value === 0 && Math.abs(computed) < ROUNDING_NOISE ? 0 : computed });
  return { formula, substituted, result };
}

/** Adds title, case and result to a draft. */
export function finish(scope: ChainScope, draft: Draft): Working {
  return {
    title: draft.title,
    gbwCase: scope.facts.gbwCase,
    result: formatFigure(scope.figure),
    steps: draft.steps,
    data: draft.data,
    assumptions: draft.assumptions ?? [],
    validity: draft.validity ?? [],
    source: draft.source,
  };
}
