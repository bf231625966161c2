import type { DataMark } from '../api/types';
import styles from './data-marks.module.css';

const SHORT: Readonly<Record<DataMark['kind'], string>> = {
  assumed: 'assumed',
  'typical-only': 'typical only',
  'not-verified': 'not verified',
  lifecycle: 'lifecycle',
  'quote-lapsed': 'quote lapsed',
  caution: 'caution',
};

/** Marks of data quality beside a verdict; they never change it. Same kinds are shown once with all their texts. */
export function DataMarks({ marks }: { marks: readonly DataMark[] }) {
  if (marks.length === 0) return null;
  const kinds = [...new Set(marks.map((mark) => mark.kind))];
  return (
    <ul className={styles.marks} aria-label="Data quality">
      {kinds.map((kind) => {
        const texts = marks.filter((mark) => mark.kind === kind).map((mark) => mark.text);
        return (
          <li key={kind} className={styles.mark} title={texts.join('\n')}>
            {SHORT[kind]}
            {texts.length > 1 && ` ${texts.length}`}
            <span className="visually-hidden">: {texts.join('; ')}</span>
          </li>
        );
      })}
    </ul>
  );
}

/** Grade of a device; only the RF grade is marked, because it is what costs. */
export function GradeMark({ grade }: { grade: 'general-purpose' | 'rf' | null }) {
  if (grade !== 'rf') return null;
  return (
    <span className={styles.grade} title="RF grade">
      RF<span className="visually-hidden"> grade</span>
    </span>
  );
}
