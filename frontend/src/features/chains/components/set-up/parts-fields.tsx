import type { FeedbackStage } from '../../../../api/types';
import { QuantityInput } from '../../../../components/quantity-input';
import { formatFigure } from '../../../../lib/format-figure';
import { isNonInverting, withCoupling } from '../../lib/topology';
import { useWorkspace } from '../workspace-context';
import { LoadText } from './load-text';
import { useStageForm } from './use-stage-form';

/** The parts around the amplifier, from its input to its output; empty means that the part is not there. */
export function PartsFields({ stage }: { stage: FeedbackStage }) {
  const { set, replace, error, disabled } = useStageForm(stage);
  const resistor = { unit: 'Ω', maximum: 1e12, disabled, placeholder: 'none' } as const;
  const capacitor = { maximum: 1, minimum: 0, disabled, placeholder: 'none' } as const;
  return (
    <>
      <QuantityInput
        {...capacitor}
        label="Cf across Rf"
        unit="pF"
        value={stage.feedbackF ?? null}
        error={error('feedbackF')}
        onChange={(value) => set('feedbackF', 'Cf', { feedbackF: value ?? undefined })}
      />
      <QuantityInput
        {...capacitor}
        label="Input coupling"
        unit="nF"
        exclusiveMinimum
        value={stage.couplingF ?? null}
        error={error('couplingF')}
        suffix={<CouplingCorner stage={stage} />}
        onChange={(couplingF) => replace(withCoupling(stage, couplingF), 'input coupling', 'couplingF')}
      />
      {isNonInverting(stage.topology) && (
        <QuantityInput
          {...resistor}
          label="Bias to ground"
          minimum={0}
          exclusiveMinimum
          value={stage.biasOhm ?? null}
          error={error('biasOhm')}
          onChange={(biasOhm) => set('biasOhm', 'bias resistor', { biasOhm })}
        />
      )}
      <QuantityInput
        {...resistor}
        label="Termination"
        minimum={0}
        exclusiveMinimum
        value={stage.terminationOhm ?? null}
        error={error('terminationOhm')}
        onChange={(terminationOhm) => set('terminationOhm', 'termination', { terminationOhm })}
      />
      <QuantityInput
        {...capacitor}
        label="Stray at − pin"
        unit="pF"
        value={stage.strayF ?? null}
        error={error('strayF')}
        onChange={(value) => set('strayF', 'stray capacitance', { strayF: value ?? undefined })}
      />
      <QuantityInput
        {...resistor}
        label="Isolation at output"
        minimum={0}
        value={stage.isolationOhm ?? null}
        error={error('isolationOhm')}
        onChange={(value) => set('isolationOhm', 'isolation', { isolationOhm: value ?? undefined })}
      />
      <LoadText stageId={stage.id} />
    </>
  );
}

/** "nF → 159 kHz": the lower corner that the coupling makes, as computed. */
function CouplingCorner({ stage }: { stage: FeedbackStage }) {
  const { preview, gbwCase } = useWorkspace();
  const report = preview.report?.stages.find((each) => each.stageId === stage.id);
  const corner = report?.cases[gbwCase].figures.cornerLower;
  if (!stage.couplingF || !corner || corner.value === null) return 'nF';
  return `nF → ${formatFigure(corner).text}`;
}
