import HolderOutlined from '@ant-design/icons/es/icons/HolderOutlined';
import { useSortable } from '@dnd-kit/sortable';
import type { KeyboardEvent } from 'react';

import type { Stage, StageReport } from '../../../../api/types';
import { useWorkspace } from '../workspace-context';
import { RowFigures } from './row-figures';
import { StageCell } from './stage-cell';
import styles from './ledger.module.css';
import type { RowKeys } from './use-row-keys';

const FIGURE_COLUMNS = 14;

interface LedgerRowProps {
  stage: Stage;
  index: number;
  /** Null until the first figures of a new stage are there. */
  report: StageReport | null;
  rows: RowKeys;
}

export function LedgerRow({ stage, index, report, rows }: LedgerRowProps) {
  const { address, editable } = useWorkspace();
  const { setNodeRef, setActivatorNodeRef, listeners, transform, transition, isDragging } = useSortable({
    id: stage.id,
    disabled: !editable,
  });
  const selected = address.stageId === stage.id;
  const classes = [styles.row, selected ? styles.selected : '', isDragging ? styles.dragging : ''].join(' ');
  return (
    <tr
      ref={setNodeRef}
      data-stage={stage.id}
      className={classes}
      style={transform ? { transform: `translateY(${transform.y}px)`, transition } : undefined}
      tabIndex={rows.currentId === stage.id ? 0 : -1}
      aria-current={selected ? 'true' : undefined}
      aria-label={`S${index + 1} ${stage.name}${report ? `, ${report.verdict.verdict}` : ''}`}
      onFocus={() => rows.setCurrentId(stage.id)}
      onClick={() => address.change({ stageId: stage.id })}
      onKeyDown={(event: KeyboardEvent) => rows.onKeyDown(event, stage.id)}
    >
      <StageCell stage={stage} index={index} report={report}>
        {editable ? (
          <span
            ref={setActivatorNodeRef}
            className={styles.handle}
            title="Drag to reorder (Alt + arrow keys)"
            aria-hidden="true"
            {...listeners}
          >
            <HolderOutlined />
          </span>
        ) : (
          <span className={styles.handle} />
        )}
      </StageCell>
      {report ? (
        <RowFigures report={report} />
      ) : (
        <td colSpan={FIGURE_COLUMNS} className={styles.pending}>
          figures follow
        </td>
      )}
    </tr>
  );
}
