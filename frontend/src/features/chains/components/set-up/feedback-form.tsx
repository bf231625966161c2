import Segmented from 'antd/es/segmented';

import type { FeedbackStage } from '../../../../api/types';
import { QuantityInput } from '../../../../components/quantity-input';
import { SelectField } from '../../../../components/select-field';
import { RESISTOR_SERIES, type ResistorSeries } from '../../lib/resistor-series';
import { topologiesOf, withResistors, withTopology, withWantedGain, type Topology } from '../../lib/topology';
import { GainField } from './gain-field';
import { PartsFields } from './parts-fields';
import { ResultLine } from './result-line';
import styles from './set-up.module.css';
import { useResistorSeries } from './use-resistor-series';
import { useStageForm } from './use-stage-form';

export function FeedbackForm({ stage }: { stage: FeedbackStage }) {
  const { replace, disabled } = useStageForm(stage);
  const [series, setSeries] = useResistorSeries();
  const changeSeries = (next: ResistorSeries) => {
    setSeries(next);
    if (typeof stage.wantedGain === 'number') {
      replace(withWantedGain(stage, stage.wantedGain, next), `resistors to ${next}`);
    }
  };
  return (
    <>
      <div className={styles.fields}>
        <TopologyField stage={stage} series={series} />
        <GainField stage={stage} series={series} />
        {!disabled && <SeriesChoice series={series} onChange={changeSeries} />}
        <ResistorFields stage={stage} series={series} />
        <PartsFields stage={stage} />
      </div>
      <ResultLine stage={stage} />
    </>
  );
}

function SeriesChoice({ series, onChange }: { series: ResistorSeries; onChange: (series: ResistorSeries) => void }) {
  return (
    <div>
      <div className={styles.label}>Resistors from</div>
      <Segmented<ResistorSeries>
        block
        aria-label="Resistors from"
        className={styles.series}
        value={series}
        onChange={onChange}
        options={[...RESISTOR_SERIES]}
      />
    </div>
  );
}

function TopologyField({ stage, series }: { stage: FeedbackStage; series: ResistorSeries }) {
  const { replace, disabled, error } = useStageForm(stage);
  return (
    <SelectField<Topology>
      label="Topology"
      value={stage.topology}
      options={topologiesOf(stage.kind).map((value) => ({ value, label: value }))}
      disabled={disabled}
      error={error('topology')}
      onChange={(topology) => replace(withTopology(stage, topology, series), 'topology')}
    />
  );
}

function ResistorFields({ stage, series }: { stage: FeedbackStage; series: ResistorSeries }) {
  const { replace, disabled, error } = useStageForm(stage);
  const snapped = series === 'exact' || typeof stage.wantedGain !== 'number' ? '' : ` (${series})`;
  const follower = stage.topology === 'follower';
  return (
    <>
      <QuantityInput
        label={`Rf${snapped}`}
        ariaLabel="Feedback resistor Rf"
        unit="Ω"
        value={stage.feedbackOhm}
        required
        quietRequired
        minimum={0}
        maximum={1e12}
        disabled={disabled}
        error={error('feedbackOhm')}
        onChange={(feedbackOhm) =>
          feedbackOhm !== null && replace(withResistors(stage, { feedbackOhm }), 'Rf', 'feedbackOhm')
        }
      />
      {!follower && stage.topology !== 'transimpedance' && (
        <QuantityInput
          label={`Rg${snapped}`}
          ariaLabel="Gain resistor Rg"
          unit="Ω"
          value={stage.gainOhm ?? null}
          required
          quietRequired
          minimum={0}
          maximum={1e12}
          disabled={disabled}
          error={error('gainOhm')}
          onChange={(gainOhm) => replace(withResistors(stage, { gainOhm }), 'Rg', 'gainOhm')}
        />
      )}
    </>
  );
}
