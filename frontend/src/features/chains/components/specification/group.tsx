import type { ReactNode } from 'react';

import styles from './fields.module.css';

export function Group({ title, children }: { title: string; children: ReactNode }) {
  return (
    <fieldset className={styles.group}>
      <legend>{title}</legend>
      <div className={styles.fields}>{children}</div>
    </fieldset>
  );
}
