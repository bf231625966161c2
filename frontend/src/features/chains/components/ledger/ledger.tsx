import { closestCenter, DndContext, PointerSensor, useSensor, useSensors, type DragEndEvent } from '@dnd-kit/core';
import { SortableContext, verticalListSortingStrategy } from '@dnd-kit/sortable';
import { useRef } from 'react';

import { stageIndex } from '../../lib/draft';
import { useReport, useWorkspace } from '../workspace-context';
import { ChainRow } from './chain-row';
import { LaneDefs } from './lane-defs';
import { LedgerHead } from './ledger-head';
import { LedgerRow } from './ledger-row';
import styles from './ledger.module.css';
import { useRowKeys } from './use-row-keys';

/** One row a stage, all lanes on one axis. A pull on the handle needs a few pixels, so that a click stays a click. */
export function Ledger() {
  const { control, edits, preview } = useWorkspace();
  const report = useReport();
  const table = useRef<HTMLTableElement>(null);
  const rows = useRowKeys(table);
  const sensors = useSensors(useSensor(PointerSensor, { activationConstraint: { distance: 4 } }));
  const { stages } = control.draft;

  const drop = ({ active, over }: DragEndEvent) => {
    if (over && active.id !== over.id) edits.move(String(active.id), stageIndex(control.draft, String(over.id)));
  };

  return (
    <div className={styles.scroll}>
      <LaneDefs />
      <DndContext sensors={sensors} collisionDetection={closestCenter} onDragEnd={drop}>
        <SortableContext items={stages.map((stage) => stage.id)} strategy={verticalListSortingStrategy}>
          <table
            ref={table}
            className={`${styles.ledger} ${preview.outdated ? styles.outdated : ''}`}
            aria-label="Ledger"
          >
            <LedgerHead />
            <tbody>
              {stages.map((stage, index) => (
                <LedgerRow
                  key={stage.id}
                  stage={stage}
                  index={index}
                  report={report.stages.find((each) => each.stageId === stage.id) ?? null}
                  rows={rows}
                />
              ))}
            </tbody>
            <ChainRow />
          </table>
        </SortableContext>
      </DndContext>
    </div>
  );
}
