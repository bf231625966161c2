import { useState } from 'react';

import type { FeedbackStage } from '../../../../api/types';
import { QuantityInput } from '../../../../components/quantity-input';
import { formatSignificant, formatValue } from '../../../../lib/format-figure';
import { gainOfResistors } from '../../lib/resistors';
import type { ResistorSeries } from '../../lib/resistor-series';
import { gainProblem, withWantedGain } from '../../lib/topology';
import { useStageForm } from './use-stage-form';

/** What was typed, and the wanted gain that the stage had then. */
interface Entry {
  readonly typed: number | null;
  readonly wanted: number | null;
}

function decibelText(gain: number | null): string {
  return gain === null || gain === 0 ? '' : formatValue(20 * Math.log10(Math.abs(gain)), 'dB', 3);
}

function rounded(gain: number | null): number | null {
  return gain === null ? null : Number(gain.toPrecision(6));
}

/**
 * The wanted gain; the resistors follow it. The sign belongs to the topology, so a typed 10 or 20 dB of an inverting
 * stage means −10; the text is left as it was typed.
 */
export function GainField({ stage, series }: { stage: FeedbackStage; series: ResistorSeries }) {
  const { replace, error, disabled } = useStageForm(stage);
  const [entry, setEntry] = useState<Entry | null>(null);
  const wanted = stage.wantedGain ?? null;
  // What was typed stays as it was; a gain from elsewhere (20 dB stored as a ratio) is shown without its rounding noise.
  const shown = entry && Object.is(entry.wanted, wanted) ? entry.typed : rounded(wanted);
  const problem = shown === null ? null : gainProblem(stage.topology, shown);
  const transimpedance = stage.topology === 'transimpedance';
  const actual = gainOfResistors(stage.topology, stage.feedbackOhm, stage.gainOhm);

  const change = (typed: number | null) => {
    if (typed === null || gainProblem(stage.topology, typed) !== null) {
      setEntry({ typed, wanted });
      return;
    }
    const next = withWantedGain(stage, typed, series);
    setEntry({ typed, wanted: next.wantedGain ?? null });
    replace(next, 'gain', 'wantedGain');
  };

  if (stage.topology === 'follower') {
    return (
      <QuantityInput label="Wanted gain" unit="gain" value={1} onChange={() => undefined} disabled suffix="0 dB" />
    );
  }
  return (
    <QuantityInput
      label={transimpedance ? 'Wanted transimpedance' : 'Wanted gain'}
      unit={transimpedance ? 'V/A' : 'gain'}
      value={transimpedance && shown !== null ? Math.abs(shown) : shown}
      onChange={change}
      disabled={disabled}
      error={problem ?? error('wantedGain')}
      suffix={transimpedance ? 'Ω' : `× = ${decibelText(wanted ?? actual)}`}
      placeholder={actual === null ? '' : `${formatSignificant(actual, 4)} by resistors`}
    />
  );
}
