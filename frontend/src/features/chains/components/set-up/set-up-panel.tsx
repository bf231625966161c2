import ArrowDownOutlined from '@ant-design/icons/es/icons/ArrowDownOutlined';
import ArrowUpOutlined from '@ant-design/icons/es/icons/ArrowUpOutlined';
import CloseOutlined from '@ant-design/icons/es/icons/CloseOutlined';
import CopyOutlined from '@ant-design/icons/es/icons/CopyOutlined';
import DeleteOutlined from '@ant-design/icons/es/icons/DeleteOutlined';
import Button from 'antd/es/button';
import Drawer from 'antd/es/drawer';
import type { KeyboardEvent, ReactElement } from 'react';

import type { Stage } from '../../../../api/types';
import { neighbourOf, stageIndex } from '../../lib/draft';
import { rowOf } from '../ledger/row-of';
import { useNarrow } from '../use-narrow';
import { useWorkspace } from '../workspace-context';
import { BlockForm } from './block-form';
import { DevicePicker } from './device-picker';
import { FeedbackForm } from './feedback-form';
import { NameField } from './name-field';
import { RcForm } from './rc-form';
import styles from './set-up.module.css';
import { StageFindings } from './stage-findings';

/** The set-up of the selected stage: docked below the rows, on a narrow screen a sheet of its own. */
export function SetUpPanel() {
  const { control, address } = useWorkspace();
  const narrow = useNarrow();
  const stage = control.draft.stages.find((each) => each.id === address.stageId);
  if (!stage) return null;
  const close = () => address.change({ stageId: null });
  if (narrow) {
    return (
      <Drawer open placement="bottom" size="100%" closable={false} onClose={close} styles={{ body: { padding: 14 } }}>
        <PanelBody stage={stage} onClose={close} />
      </Drawer>
    );
  }
  return <DockedPanel stage={stage} onClose={close} />;
}

interface PanelProps {
  stage: Stage;
  onClose: () => void;
}

function DockedPanel({ stage, onClose }: PanelProps) {
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Escape' || event.defaultPrevented) return;
    onClose();
    rowOf(document, stage.id)?.focus();
  };
  return (
    <section
      id="set-up-panel"
      className={styles.panel}
      aria-label={`Set-up of ${stage.name}`}
      tabIndex={-1}
      onKeyDown={onKeyDown}
    >
      <PanelBody stage={stage} onClose={onClose} />
    </section>
  );
}

function PanelBody({ stage, onClose }: PanelProps) {
  const { control, preview } = useWorkspace();
  const report = preview.report?.stages.find((each) => each.stageId === stage.id) ?? null;
  return (
    // The stage is the key: another stage gets fresh fields, not the half-typed text of this one.
    <div key={stage.id} className={styles.grid} onBlur={control.settle}>
      <section className={styles.column} aria-label="Set-up">
        <PanelHead stage={stage} onClose={onClose} />
        <StageForm stage={stage} />
      </section>
      {stage.kind === 'rc-section' ? (
        <section className={styles.column} aria-label="Checks">
          <h3>This stage</h3>
          {report && <StageFindings report={report} />}
        </section>
      ) : (
        <DevicePicker stage={stage} />
      )}
    </div>
  );
}

/** A kind without a form does not compile. */
function StageForm({ stage }: { stage: Stage }): ReactElement {
  switch (stage.kind) {
    case 'voltage-feedback':
    case 'current-feedback':
      return <FeedbackForm stage={stage} />;
    case 'rc-section':
      return <RcForm stage={stage} />;
    case 'matched-block':
      return <BlockForm stage={stage} />;
  }
}

function PanelHead({ stage, onClose }: PanelProps) {
  const { control, edits, address, editable } = useWorkspace();
  const { draft } = control;
  const index = stageIndex(draft, stage.id);
  const remove = () => {
    edits.remove(stage.id);
    address.change({ stageId: neighbourOf(draft, stage.id) });
  };
  return (
    <div className={styles.head}>
      <NameField stage={stage} index={index} />
      <div className={styles.headActions}>
        {editable && (
          <>
            <IconButton
              label="Move up"
              icon={<ArrowUpOutlined />}
              disabled={index === 0}
              onClick={() => edits.move(stage.id, index - 1)}
            />
            <IconButton
              label="Move down"
              icon={<ArrowDownOutlined />}
              disabled={index === draft.stages.length - 1}
              onClick={() => edits.move(stage.id, index + 1)}
            />
            <IconButton
              label="Duplicate"
              icon={<CopyOutlined />}
              onClick={() => address.change({ stageId: edits.duplicate(stage.id) })}
            />
            <IconButton label="Remove" icon={<DeleteOutlined />} onClick={remove} />
          </>
        )}
        <IconButton label="Close the set-up" icon={<CloseOutlined />} onClick={onClose} />
      </div>
    </div>
  );
}

interface IconButtonProps {
  label: string;
  icon: React.ReactNode;
  disabled?: boolean;
  onClick: () => void;
}

function IconButton({ label, icon, disabled, onClick }: IconButtonProps) {
  return (
    <Button
      size="small"
      type="text"
      icon={icon}
      aria-label={label}
      title={label}
      disabled={disabled}
      onClick={onClick}
    />
  );
}
