import { Suspense } from 'react';
import { Link } from 'react-router-dom';

import { VerdictIcon } from '../../../../components/verdict-mark';
import type { ChainOptionRow } from '../../../../api/types';
import { OptionMenu } from '../lazy-parts';
import { useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

/** All options side by side; the one on the screen is solid. */
export function OptionBar() {
  const { chain, option, editable } = useWorkspace();
  return (
    <nav className={styles.options} aria-label="Options">
      {chain.options.map((row) => (
        <OptionLink key={row.id} row={row} current={row.id === option.id} />
      ))}
      <Suspense fallback={null}>{editable && <OptionMenu />}</Suspense>
    </nav>
  );
}

function OptionLink({ row, current }: { row: ChainOptionRow; current: boolean }) {
  const { control, preview, address } = useWorkspace();
  const verdict = (current ? preview.report?.verdict.verdict : undefined) ?? row.summary.verdict;
  const search = new URLSearchParams({ option: row.id, ...(address.gbwCase && { case: address.gbwCase }) });
  return (
    <Link
      to={{ search: `?${search}` }}
      className={`${styles.option} ${current ? styles.optionCurrent : ''}`}
      aria-current={current ? 'page' : undefined}
      title={row.summary.lead ? `${row.summary.lead} ${row.summary.text}` : verdict}
    >
      {current ? control.draft.name : row.name}
      {!current && (
        <>
          <VerdictIcon verdict={verdict} size={11} />
          <span className="visually-hidden">, {verdict}</span>
        </>
      )}
    </Link>
  );
}
