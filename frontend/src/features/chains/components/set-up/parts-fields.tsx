import type { FeedbackStage } from '../../../../api/types';
import { QuantityInput } from '../../../../components/quantity-input';
import { formatFigure } from '../../../../lib/format-figure';
import { isNonInverting, withCoupling } from '../../lib/topology';
import { useWorkspace } from '../workspace-context';
import { LoadText } from './load-text';
import { useStageForm } from './use-stage-form';

type PartKey = 'feedbackF' | 'strayF' | 'terminationOhm' | 'biasOhm' | 'isolationOhm';

/** Zero is the same as no part where it is allowed. */
const PARTS: Readonly<Record<PartKey, { label: string; unit: 'Ω' | 'pF'; zeroAllowed: boolean }>> = {
  feedbackF: { label: 'Cf across Rf', unit: 'pF', zeroAllowed: true },
  strayF: { label: 'Stray at − pin', unit: 'pF', zeroAllowed: true },
  terminationOhm: { label: 'Termination', unit: 'Ω', zeroAllowed: false },
  biasOhm: { label: 'Bias to ground', unit: 'Ω', zeroAllowed: false },
  isolationOhm: { label: 'Isolation at output', unit: 'Ω', zeroAllowed: true },
};

/** The parts around the amplifier, from its input to its output; empty means that the part is not there. */
export function PartsFields({ stage }: { stage: FeedbackStage }) {
  return (
    <>
      <PartField stage={stage} part="feedbackF" />
      <CouplingField stage={stage} />
      {isNonInverting(stage.topology) && <PartField stage={stage} part="biasOhm" />}
      <PartField stage={stage} part="terminationOhm" />
      <PartField stage={stage} part="strayF" />
      <PartField stage={stage} part="isolationOhm" />
      <LoadText stageId={stage.id} />
    </>
  );
}

function PartField({ stage, part }: { stage: FeedbackStage; part: PartKey }) {
  const { set, error, disabled } = useStageForm(stage);
  const { label, unit, zeroAllowed } = PARTS[part];
  return (
    <QuantityInput
      label={label}
      unit={unit}
      minimum={0}
      exclusiveMinimum={!zeroAllowed}
      maximum={unit === 'pF' ? 1 : 1e12}
      placeholder="none"
      disabled={disabled}
      value={stage[part] ?? null}
      error={error(part)}
      onChange={(value) => set(part, label, { [part]: value ?? undefined })}
    />
  );
}

function CouplingField({ stage }: { stage: FeedbackStage }) {
  const { replace, error, disabled } = useStageForm(stage);
  return (
    <QuantityInput
      label="Input coupling"
      unit="nF"
      minimum={0}
      exclusiveMinimum
      maximum={1}
      placeholder="none"
      disabled={disabled}
      value={stage.couplingF ?? null}
      error={error('couplingF')}
      suffix={<CouplingCorner stage={stage} />}
      onChange={(couplingF) => replace(withCoupling(stage, couplingF), 'input coupling', 'couplingF')}
    />
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
