import { useEffect, type ReactNode } from 'react';

import { LogoMark } from '../../../components/logo';
import styles from './session-card.module.css';

/** Frame of the pages in front of sign-in. */
export function SessionCard({ title, children }: { title: string; children: ReactNode }) {
  useEffect(() => {
    document.title = `${title} · Bandledger`;
  }, [title]);
  return (
    <main className={styles.page}>
      <div className={styles.card}>
        <div className={styles.brand}>
          <LogoMark size={30} />
          <span>Bandledger</span>
        </div>
        <p className={styles.claim}>
          Gain-bandwidth budgets of amplifier chains: what a device has, what a stage spends, what is left.
        </p>
        <h1 className={styles.title}>{title}</h1>
        {children}
      </div>
      <Lanes />
    </main>
  );
}

/** The product's picture: lanes on a frequency axis, one of them ending inside the band. */
function Lanes() {
  const lanes = [
    { solid: 300, end: 350, tone: 'var(--clear)' },
    { solid: 120, end: 172, tone: 'var(--over)' },
    { solid: 260, end: 310, tone: 'var(--clear)' },
    { solid: 330, end: 366, tone: 'var(--clear)' },
  ];
  return (
    <svg className={styles.lanes} viewBox="0 0 400 220" aria-hidden="true" focusable="false">
      <rect x="132" y="0" width="44" height="220" fill="var(--band)" />
      {[80, 200, 320].map((x) => (
        <path key={x} d={`M${x} 0v220`} stroke="var(--rule)" />
      ))}
      {lanes.map(({ solid, end, tone }, index) => (
        <g key={tone + String(end)} fill={tone} stroke={tone}>
          <rect x="0" y={22 + index * 50} width={solid} height="12" stroke="none" />
          <rect x={solid} y={22 + index * 50} width={end - solid} height="12" stroke="none" opacity="0.45" />
          <path d={`M${end} ${16 + index * 50}v24`} strokeWidth="3" />
        </g>
      ))}
    </svg>
  );
}
