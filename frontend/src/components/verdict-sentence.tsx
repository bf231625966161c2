import type { ReactNode } from 'react';

import type { Verdict } from '../api/types';
import { VerdictIcon } from './verdict-mark';
import styles from './verdict-sentence.module.css';

interface VerdictSentenceProps {
  verdict: Verdict;
  /** Bold opening, e.g. "S2 spends more than it has." */
  lead: string;
  text: string;
  /** Buttons or links behind the sentence. */
  children?: ReactNode;
}

/** The band that says what breaks first. */
export function VerdictSentence({ verdict, lead, text, children }: VerdictSentenceProps) {
  return (
    <section className={`${styles.band} ${styles[verdict]}`} aria-label={`Verdict: ${verdict}`}>
      <VerdictIcon verdict={verdict} size={20} />
      <p className={styles.text}>
        <span className="visually-hidden">{verdict}: </span>
        {lead && <strong className={styles.lead}>{lead} </strong>}
        {text}
      </p>
      {children && <div className={styles.actions}>{children}</div>}
    </section>
  );
}
