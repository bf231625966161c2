import PlusOutlined from '@ant-design/icons/es/icons/PlusOutlined';
import Button from 'antd/es/button';
import { Suspense, useState } from 'react';

import { MAXIMUM_STAGES } from '../../../../api/types';
import { LaneLegend } from '../ledger/lane-legend';
import { Ledger } from '../ledger/ledger';
import { LedgerCards } from '../ledger/ledger-cards';
import { AddStage } from '../lazy-parts';
import { useNarrow } from '../use-narrow';
import { useWorkspace } from '../workspace-context';
import { EmptyChain } from './empty-chain';
import styles from './frame.module.css';
import { LastStep } from './last-step';

export function LedgerSection() {
  const { control, preview, chain } = useWorkspace();
  const narrow = useNarrow();
  const [adding, setAdding] = useState(false);
  const { headroomTarget, bandwidthTarget } = chain.policy;
  const empty = control.draft.stages.length === 0;
  return (
    <>
      {empty && <EmptyChain onAdd={() => setAdding(true)} />}
      {!empty && preview.report && (
        <>
          {narrow ? <LedgerCards /> : <Ledger />}
          <AddButton onClick={() => setAdding(true)} />
          <LaneLegend headroomTarget={headroomTarget} bandwidthTarget={bandwidthTarget} />
        </>
      )}
      <Suspense fallback={null}>{adding && <AddStage onClose={() => setAdding(false)} />}</Suspense>
    </>
  );
}

function AddButton({ onClick }: { onClick: () => void }) {
  const { control, editable } = useWorkspace();
  if (!editable) return null;
  const full = control.draft.stages.length >= MAXIMUM_STAGES;
  return (
    <div className={styles.addRow}>
      <Button icon={<PlusOutlined />} onClick={onClick} disabled={full}>
        Add a stage
      </Button>
      <LastStep />
      {full && <span className="soft">A chain has at most {MAXIMUM_STAGES} stages.</span>}
    </div>
  );
}
