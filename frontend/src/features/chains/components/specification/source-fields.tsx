import type { CurrentSource, LevelKind, Source, VoltageSource } from '../../../../api/types';
import { QuantityInput } from '../../../../components/quantity-input';
import { SelectField } from '../../../../components/select-field';
import type { QuantityUnit } from '../../../../lib/quantity-units';
import { withSourceKind } from '../../lib/specification-defaults';
import { Group } from './group';
import type { SpecificationFieldsProps } from './specification-form';

const SOURCE_KINDS: readonly { value: Source['kind']; label: string }[] = [
  { value: 'voltage', label: 'Voltage source' },
  { value: 'current', label: 'Current source, as a photodiode' },
];

const LEVEL_KINDS: readonly { value: LevelKind; label: string; unit: QuantityUnit }[] = [
  { value: 'peak-emf', label: 'V peak, EMF', unit: 'mV' },
  { value: 'rms-emf', label: 'V rms, EMF', unit: 'mV' },
  { value: 'available-power', label: 'dBm, available power', unit: 'dBm' },
];

export function SourceFields(props: SpecificationFieldsProps) {
  const { specification, onChange, messages, disabled } = props;
  const { source } = specification;
  return (
    <Group title="Source">
      <SelectField
        label="Kind"
        value={source.kind}
        options={SOURCE_KINDS}
        disabled={disabled}
        onChange={(kind) => onChange(withSourceKind(specification, kind), 'source.kind')}
      />
      <QuantityInput
        label={source.kind === 'voltage' ? 'Series resistance' : 'Shunt resistance'}
        unit="Ω"
        required
        minimum={0}
        exclusiveMinimum
        maximum={1e12}
        disabled={disabled}
        value={source.resistanceOhm}
        error={messages['source.resistanceOhm']}
        onChange={(resistanceOhm) =>
          resistanceOhm !== null &&
          onChange({ ...specification, source: { ...source, resistanceOhm } }, 'source.resistanceOhm')
        }
      />
      {source.kind === 'voltage' ? (
        <VoltageFields {...props} source={source} />
      ) : (
        <CurrentFields {...props} source={source} />
      )}
    </Group>
  );
}

function VoltageFields(props: SpecificationFieldsProps & { source: VoltageSource }) {
  const { specification, onChange, messages, disabled, source } = props;
  const set = (change: Partial<VoltageSource>, field: string) =>
    onChange({ ...specification, source: { ...source, ...change } }, `source.${field}`);
  const unit = LEVEL_KINDS.find((kind) => kind.value === source.levelKind)?.unit ?? 'mV';
  const common = { unit, disabled, placeholder: 'not given' } as const;
  return (
    <>
      <SelectField
        label="Levels are in"
        value={source.levelKind}
        options={LEVEL_KINDS}
        disabled={disabled}
        // The numbers of one kind of level mean something else in another.
        onChange={(levelKind) => set({ levelKind, nominalLevel: undefined, largestLevel: undefined }, 'levelKind')}
      />
      <QuantityInput
        {...common}
        key={`nominal-${unit}`}
        label="Nominal level"
        value={source.nominalLevel ?? null}
        error={messages['source.nominalLevel']}
        onChange={(value) => set({ nominalLevel: value ?? undefined }, 'nominalLevel')}
      />
      <QuantityInput
        {...common}
        key={`largest-${unit}`}
        label="Largest level"
        hint="Swing and slew are judged at it."
        value={source.largestLevel ?? null}
        error={messages['source.largestLevel']}
        onChange={(value) => set({ largestLevel: value ?? undefined }, 'largestLevel')}
      />
    </>
  );
}

function CurrentFields(props: SpecificationFieldsProps & { source: CurrentSource }) {
  const { specification, onChange, messages, disabled, source } = props;
  const set = (change: Partial<CurrentSource>, field: string) =>
    onChange({ ...specification, source: { ...source, ...change } }, `source.${field}`);
  const level = { unit: 'µA', minimum: 0, disabled, placeholder: 'not given' } as const;
  return (
    <>
      <QuantityInput
        label="Capacitance"
        unit="pF"
        required
        minimum={0}
        maximum={1}
        disabled={disabled}
        value={source.capacitanceF}
        error={messages['source.capacitanceF']}
        onChange={(capacitanceF) => capacitanceF !== null && set({ capacitanceF }, 'capacitanceF')}
      />
      <QuantityInput
        {...level}
        label="Nominal level, peak"
        value={source.nominalLevel ?? null}
        error={messages['source.nominalLevel']}
        onChange={(value) => set({ nominalLevel: value ?? undefined }, 'nominalLevel')}
      />
      <QuantityInput
        {...level}
        label="Largest level, peak"
        value={source.largestLevel ?? null}
        error={messages['source.largestLevel']}
        onChange={(value) => set({ largestLevel: value ?? undefined }, 'largestLevel')}
      />
      <QuantityInput
        {...level}
        label="Dark and ambient current"
        value={source.dcCurrentA ?? null}
        error={messages['source.dcCurrentA']}
        onChange={(value) => set({ dcCurrentA: value ?? undefined }, 'dcCurrentA')}
      />
    </>
  );
}
