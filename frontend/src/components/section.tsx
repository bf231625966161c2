import { useId, type ReactNode } from 'react';

import styles from './section.module.css';

/** A named part of a page with its own actions. */
export function Section({ title, extra, children }: { title: string; extra?: ReactNode; children: ReactNode }) {
  const id = useId();
  return (
    <section className={styles.section} aria-labelledby={id}>
      <div className={styles.head}>
        <h2 id={id}>{title}</h2>
        {extra}
      </div>
      {children}
    </section>
  );
}
