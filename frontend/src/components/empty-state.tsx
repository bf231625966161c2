import type { ReactNode } from 'react';

import styles from './empty-state.module.css';

/** What to do when there is nothing yet. */
export function EmptyState({ title, children, action }: { title: string; children?: ReactNode; action?: ReactNode }) {
  return (
    <div className={styles.empty}>
      <svg width="56" height="28" viewBox="0 0 56 28" fill="none" aria-hidden="true" focusable="false">
        <path d="M2 7h30l12 14" stroke="var(--border-control)" strokeWidth="2" strokeDasharray="4 3" />
        <path d="M2 16h16l9 10" stroke="var(--copper-fill)" strokeWidth="2" strokeDasharray="4 3" />
      </svg>
      <h2>{title}</h2>
      {children && <p className={styles.text}>{children}</p>}
      {action && <div className={styles.action}>{action}</div>}
    </div>
  );
}
