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

/** The text stays as it was typed; the wanted gain of the stage follows it where the topology can have it. */
function useGainEntry(stage: FeedbackStage, series: ResistorSeries) {
  const { replace } = useStageForm(stage);
  const [entry, setEntry] = useState<Entry | null>(null);
  const wanted = stage.wantedGain ?? null;
  // A gain from elsewhere (20 dB stored as a ratio) is shown without its rounding noise.
  const shown = entry && Object.is(entry.wanted, wanted) ? entry.typed : rounded(wanted);
  const change = (typed: number | null) => {
    if (typed === null || gainProblem(stage.topology, typed) !== null) {
      setEntry({ typed, wanted });
      return;
    }
    const next = withWantedGain(stage, typed, series);
    setEntry({ typed, wanted: next.wantedGain ?? null });
    replace(next, 'gain', 'wantedGain');
  };
  return { shown, change, problem: shown === null ? null : gainProblem(stage.topology, shown) };
}

interface GainFieldProps {
  stage: FeedbackStage;
  series: ResistorSeries;
}

/** The wanted gain; the resistors follow it. */
export function GainField({ stage, series }: GainFieldProps) {
  if (stage.topology === 'follower') {
    return (
      <QuantityInput label="Wanted gain" unit="gain" value={1} onChange={() => undefined} disabled suffix="0 dB" />
    );
  }
  const Field = stage.topology === 'transimpedance' ? TransimpedanceField : RatioField;
  return <Field stage={stage} series={series} />;
}

/** The sign belongs to the topology: a typed 10 or 20 dB of an inverting stage means −10. */
function RatioField({ stage, series }: GainFieldProps) {
  const { error, disabled } = useStageForm(stage);
  const { shown, change, problem } = useGainEntry(stage, series);
  const actual = gainOfResistors(stage.topology, stage.feedbackOhm, stage.gainOhm);
  return (
    <QuantityInput
      label="Wanted gain"
      unit="gain"
      value={shown}
      onChange={change}
      disabled={disabled}
      error={problem ?? error('wantedGain')}
      suffix={`= ${decibelText(stage.wantedGain ?? actual)}`}
      placeholder={actual === null ? '' : formatSignificant(actual, 4)}
    />
  );
}

function TransimpedanceField({ stage, series }: GainFieldProps) {
  const { error, disabled } = useStageForm(stage);
  const { shown, change, problem } = useGainEntry(stage, series);
  return (
    <QuantityInput
      label="Wanted transimpedance"
      unit="V/A"
      value={shown === null ? null : Math.abs(shown)}
      onChange={change}
      disabled={disabled}
      error={problem ?? error('wantedGain')}
      placeholder="by Rf"
    />
  );
}
