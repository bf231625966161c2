import type { RcSectionStage } from '../../../../api/types';
import { QuantityInput } from '../../../../components/quantity-input';
import { LoadText } from './load-text';
import styles from './set-up.module.css';
import { useStageForm } from './use-stage-form';

export function RcForm({ stage }: { stage: RcSectionStage }) {
  const { set, error, disabled } = useStageForm(stage);
  const common = { minimum: 0, disabled, placeholder: 'none' } as const;
  return (
    <div className={styles.fields}>
      <QuantityInput
        {...common}
        label="Series R"
        unit="Ω"
        value={stage.seriesOhm ?? null}
        error={error('seriesOhm')}
        onChange={(value) => set('seriesOhm', 'series resistor', { seriesOhm: value ?? undefined })}
      />
      <QuantityInput
        {...common}
        label="Series C"
        unit="nF"
        exclusiveMinimum
        value={stage.seriesF ?? null}
        error={error('seriesF')}
        onChange={(seriesF) => set('seriesF', 'series capacitor', { seriesF })}
      />
      <QuantityInput
        {...common}
        label="Shunt R"
        unit="Ω"
        exclusiveMinimum
        value={stage.shuntOhm ?? null}
        error={error('shuntOhm')}
        onChange={(shuntOhm) => set('shuntOhm', 'shunt resistor', { shuntOhm })}
      />
      <QuantityInput
        {...common}
        label="Shunt C"
        unit="pF"
        value={stage.shuntF ?? null}
        error={error('shuntF')}
        onChange={(value) => set('shuntF', 'shunt capacitor', { shuntF: value ?? undefined })}
      />
      <LoadText stageId={stage.id} />
    </div>
  );
}
