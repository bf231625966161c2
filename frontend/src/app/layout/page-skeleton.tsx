import styles from './page-skeleton.module.css';

/** What stands there until a page has arrived. */
export function PageSkeleton() {
  return (
    <div className={styles.skeleton} role="status" aria-label="Loading">
      <div className={styles.title} />
      <div className={styles.line} />
      <div className={styles.line} />
      <div className={styles.line} />
    </div>
  );
}
