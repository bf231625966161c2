import type { ReactNode } from 'react';

import styles from './page.module.css';

/** Edges of a page. `wide` uses the whole width (chain workspace), else the text stays readable. */
export function Page({ children, wide }: { children: ReactNode; wide?: boolean }) {
  return <div className={`${styles.page} ${wide ? '' : styles.limited}`}>{children}</div>;
}
