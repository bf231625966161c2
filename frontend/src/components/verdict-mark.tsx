import type { Verdict } from '../api/types';
import styles from './verdict-mark.module.css';

/** Shapes differ as much as colours: check, barred circle, triangle, open question. */
const SHAPES: Readonly<Record<Verdict, React.ReactNode>> = {
  clear: <path d="M2.5 8.5 6.5 12.5 13.5 4" strokeWidth="2.4" />,
  tight: (
    <>
      <circle cx="8" cy="8" r="6" strokeWidth="1.8" />
      <path d="M4.5 8h7" strokeWidth="2" />
    </>
  ),
  over: (
    <>
      <path d="M8 2 14.6 13.6H1.4Z" strokeWidth="1.7" strokeLinejoin="round" />
      <path d="M8 6.4v3.4M8 11.6v.6" strokeWidth="1.7" />
    </>
  ),
  unknown: (
    <>
      <circle cx="8" cy="8" r="6" strokeWidth="1.6" strokeDasharray="2.4 2.3" />
      <path d="M6.2 6.6a1.8 1.8 0 1 1 2.6 1.6c-.6.3-.8.6-.8 1.2M8 11v.5" strokeWidth="1.5" />
    </>
  ),
};

export function VerdictIcon({ verdict, size = 16 }: { verdict: Verdict; size?: number }) {
  return (
    <svg
      className={styles[verdict]}
      width={size}
      height={size}
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      aria-hidden="true"
      focusable="false"
    >
      {SHAPES[verdict]}
    </svg>
  );
}

/** Icon, word and colour; the word stays readable in grey. `title` gives the sentence on hover. */
export function VerdictMark({ verdict, title }: { verdict: Verdict; title?: string }) {
  return (
    <span className={`${styles.mark} ${styles[verdict]}`} title={title}>
      <VerdictIcon verdict={verdict} size={14} />
      <span>{verdict}</span>
    </span>
  );
}
