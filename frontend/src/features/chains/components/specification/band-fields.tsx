import type { Band, GainBasis } from '../../../../api/types';
import { QuantityInput } from '../../../../components/quantity-input';
import { SelectField } from '../../../../components/select-field';
import { gainBasesOf } from '../../lib/specification-defaults';
import { Group } from './group';
import type { SpecificationFieldsProps } from './specification-form';

const BAND_LABELS: readonly (readonly [keyof Band, string])[] = [
  ['lowHz', 'Lower band edge'],
  ['operatingHz', 'Operating frequency'],
  ['highHz', 'Upper band edge'],
];

const BASIS_LABELS: Readonly<Record<GainBasis, string>> = {
  voltage: 'voltage gain',
  transducer: 'transducer gain',
  transimpedance: 'transimpedance',
};

const BASIS_HINTS: Readonly<Record<GainBasis, string>> = {
  voltage: 'Load voltage over EMF.',
  transducer: 'Load power over available power.',
  transimpedance: 'Load voltage over current.',
};

/** Limits as the server has them: anything from a millihertz to a terahertz. */
const FREQUENCY = { minimum: 1e-3, maximum: 1e12 } as const;

export function BandFields({ specification, onChange, messages, disabled }: SpecificationFieldsProps) {
  const { band, gainBasis } = specification;
  const bases = gainBasesOf(specification);
  return (
    <Group title="Band">
      {BAND_LABELS.map(([key, label]) => (
        <QuantityInput
          key={key}
          {...FREQUENCY}
          label={label}
          unit="MHz"
          required
          disabled={disabled}
          value={band[key]}
          error={messages[`band.${key}`] ?? bandProblem(band, key)}
          onChange={(value) =>
            value !== null && onChange({ ...specification, band: { ...band, [key]: value } }, `band.${key}`)
          }
        />
      ))}
      <SelectField
        label="Gain is counted as"
        value={gainBasis}
        options={bases.map((value) => ({ value, label: BASIS_LABELS[value] }))}
        disabled={disabled || bases.length < 2}
        error={messages['gainBasis']}
        hint={BASIS_HINTS[gainBasis]}
        onChange={(value) => onChange({ ...specification, gainBasis: value }, 'gainBasis')}
      />
    </Group>
  );
}

/** Said at the field while the server has not answered yet. */
function bandProblem(band: Band, key: keyof Band): string | null {
  if (key === 'operatingHz' && (band.operatingHz < band.lowHz || band.operatingHz > band.highHz)) {
    return 'Must lie within the band.';
  }
  return key === 'highHz' && band.highHz < band.lowHz ? 'Must not be below the lower edge.' : null;
}
