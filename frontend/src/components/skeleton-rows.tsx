import styles from './skeleton-rows.module.css';

/** Rows that stand where a list will be. */
export function SkeletonRows({ rows = 5, label = 'Loading' }: { rows?: number; label?: string }) {
  return (
    <div className={styles.rows} role="status" aria-label={label}>
      {Array.from({ length: rows }, (_unused, index) => (
        <div key={index} className={styles.row} />
      ))}
    </div>
  );
}
