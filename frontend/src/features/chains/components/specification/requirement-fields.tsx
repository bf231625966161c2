import type { Requirements } from '../../../../api/types';
import { QuantityInput } from '../../../../components/quantity-input';
import { SelectField } from '../../../../components/select-field';
import type { QuantityUnit } from '../../../../lib/quantity-units';
import { CostField } from './cost-field';
import styles from './fields.module.css';
import { Group } from './group';
import type { SpecificationFieldsProps } from './specification-form';

type NumberKey = Exclude<keyof Requirements, 'gainDb' | 'polarity' | 'costMicros'>;

interface Row {
  readonly key: NumberKey;
  readonly label: string;
  readonly unit: QuantityUnit;
  readonly minimum?: number;
}

function rowsFor(current: boolean): readonly Row[] {
  const gain: QuantityUnit = current ? 'dBΩ' : 'dB';
  return [
    { key: 'minimumGainDb', label: 'Gain at least', unit: gain },
    { key: 'maximumGainDb', label: 'Gain at most', unit: gain },
    { key: 'flatnessDb', label: 'Flatness over the band', unit: 'dB', minimum: 0 },
    { key: 'upperCornerHz', label: 'Upper −3 dB at least', unit: 'MHz', minimum: 0 },
    { key: 'lowerCornerHz', label: 'Lower −3 dB at most', unit: 'kHz', minimum: 0 },
    { key: 'inputNoise', label: 'Input noise at most', unit: current ? 'pA/√Hz' : 'nV/√Hz', minimum: 0 },
    ...(current ? [] : [{ key: 'noiseFigureDb', label: 'Noise figure at most', unit: 'dB', minimum: 0 } as const]),
    { key: 'loopGainDb', label: 'Loop gain at least', unit: 'dB' },
    { key: 'outputOffsetV', label: 'Output offset at most', unit: 'mV', minimum: 0 },
    { key: 'supplyCurrentA', label: 'Supply current at most', unit: 'mA', minimum: 0 },
    { key: 'supplyPowerW', label: 'Supply power at most', unit: 'mW', minimum: 0 },
  ];
}

/** A requirement that is not set is no check. */
export function RequirementFields(props: SpecificationFieldsProps) {
  const { specification, onChange, messages, currency, disabled } = props;
  const { requirements } = specification;
  const set = (change: Partial<Requirements>, field: string) =>
    onChange({ ...specification, requirements: { ...requirements, ...change } }, `requirements.${field}`);
  return (
    <>
      <Group title="Requirements">
        <GainFields {...props} />
        {rowsFor(specification.source.kind === 'current').map(({ key, label, unit, minimum }) => (
          <QuantityInput
            key={`${key}-${unit}`}
            label={label}
            unit={unit}
            minimum={minimum}
            placeholder="not required"
            disabled={disabled}
            value={requirements[key] ?? null}
            error={messages[`requirements.${key}`]}
            onChange={(value) => set({ [key]: value ?? undefined }, key)}
          />
        ))}
        <CostField
          currency={currency}
          disabled={disabled}
          value={requirements.costMicros ?? null}
          error={messages['requirements.costMicros']}
          onChange={(costMicros) => set({ costMicros: costMicros ?? undefined }, 'costMicros')}
        />
        <SelectField
          label="Polarity"
          value={requirements.polarity ?? ''}
          emptyLabel="either"
          options={[
            { value: 'in-phase', label: 'in phase' },
            { value: 'inverted', label: 'inverted' },
          ]}
          disabled={disabled}
          onChange={(polarity) => set({ polarity }, 'polarity')}
          onEmpty={() => set({ polarity: undefined }, 'polarity')}
        />
      </Group>
      <p className={styles.note}>An empty requirement is not checked.</p>
    </>
  );
}

const DEFAULT_TOLERANCE_DB = 1;

function GainFields({ specification, onChange, messages, disabled }: SpecificationFieldsProps) {
  const { requirements, band, source } = specification;
  const { gainDb } = requirements;
  const unit = source.kind === 'current' ? 'dBΩ' : 'dB';
  const set = (next: Requirements['gainDb'], field: string) =>
    onChange({ ...specification, requirements: { ...requirements, gainDb: next } }, `requirements.${field}`);
  return (
    <>
      <QuantityInput
        key={`target-${unit}`}
        label={`Gain at ${band.operatingHz === band.lowHz ? 'the frequency' : 'the operating frequency'}`}
        unit={unit}
        placeholder="not required"
        disabled={disabled}
        value={gainDb?.target ?? null}
        error={messages['requirements.gainDb.target']}
        onChange={(target) =>
          set(
            target === null ? undefined : { target, tolerance: gainDb?.tolerance ?? DEFAULT_TOLERANCE_DB },
            'gainDb.target',
          )
        }
      />
      <QuantityInput
        label="Gain tolerance ±"
        unit="dB"
        minimum={0}
        exclusiveMinimum
        required={gainDb !== undefined}
        disabled={disabled || gainDb === undefined}
        value={gainDb?.tolerance ?? null}
        error={messages['requirements.gainDb.tolerance']}
        onChange={(tolerance) => gainDb && tolerance !== null && set({ ...gainDb, tolerance }, 'gainDb.tolerance')}
      />
    </>
  );
}
