import { QuantityInput } from '../../../../components/quantity-input';
import { Group } from './group';
import type { SpecificationFieldsProps } from './specification-form';

const ZERO_CELSIUS_K = 273.15;
const DEFAULT_AMBIENT_K = 298.15;

export function LoadFields(props: SpecificationFieldsProps) {
  const { specification, onChange, messages, disabled } = props;
  const { load } = specification;
  return (
    <Group title="Load and supply">
      <QuantityInput
        label="Load resistance"
        unit="Ω"
        minimum={0}
        exclusiveMinimum
        maximum={1e12}
        placeholder="open"
        disabled={disabled}
        value={load.resistanceOhm}
        error={messages['load.resistanceOhm']}
        onChange={(resistanceOhm) =>
          onChange({ ...specification, load: { ...load, resistanceOhm } }, 'load.resistanceOhm')
        }
      />
      <QuantityInput
        label="Load capacitance"
        unit="pF"
        minimum={0}
        maximum={1}
        placeholder="none"
        disabled={disabled}
        value={load.capacitanceF ?? null}
        error={messages['load.capacitanceF']}
        onChange={(value) =>
          onChange({ ...specification, load: { ...load, capacitanceF: value ?? undefined } }, 'load.capacitanceF')
        }
      />
      <SupplyFields {...props} />
      <QuantityInput
        label="Ambient temperature"
        unit="°C"
        minimum={-ZERO_CELSIUS_K}
        exclusiveMinimum
        maximum={300}
        disabled={disabled}
        value={Number(((specification.ambientK ?? DEFAULT_AMBIENT_K) - ZERO_CELSIUS_K).toFixed(6))}
        error={messages['ambientK']}
        onChange={(celsius) =>
          onChange({ ...specification, ambientK: celsius === null ? undefined : celsius + ZERO_CELSIUS_K }, 'ambientK')
        }
      />
    </Group>
  );
}

function SupplyFields({ specification, onChange, messages, disabled }: SpecificationFieldsProps) {
  const { supply } = specification;
  return (
    <>
      <QuantityInput
        label="Positive supply"
        unit="V"
        required
        minimum={0}
        exclusiveMinimum
        disabled={disabled}
        value={supply.positiveV}
        error={messages['supply.positiveV']}
        onChange={(positiveV) =>
          positiveV !== null && onChange({ ...specification, supply: { ...supply, positiveV } }, 'supply.positiveV')
        }
      />
      <QuantityInput
        label="Negative supply"
        unit="V"
        required
        maximum={0}
        hint="0 V is a single supply."
        disabled={disabled}
        value={supply.negativeV}
        error={messages['supply.negativeV']}
        onChange={(negativeV) =>
          negativeV !== null && onChange({ ...specification, supply: { ...supply, negativeV } }, 'supply.negativeV')
        }
      />
    </>
  );
}
