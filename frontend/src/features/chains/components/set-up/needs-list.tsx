import type { StageNeed } from '../../../../api/types';
import styles from './set-up.module.css';

/** What a device in this place must bring. The text comes with its figure in it. */
export function NeedsList({ needs }: { needs: readonly StageNeed[] }) {
  const copy = () => void navigator.clipboard?.writeText(needs.map((need) => need.text).join('\n'));
  if (needs.length === 0) return <p className="soft">Nothing limits the choice here.</p>;
  return (
    <>
      <ul className={styles.needs}>
        {needs.map((need) => (
          <li key={need.id}>{need.text}</li>
        ))}
      </ul>
      <button type="button" className={styles.textButton} onClick={copy}>
        Copy
      </button>
    </>
  );
}
