import type { Verdict } from '../../../../api/types';

const VERDICTS: readonly Verdict[] = ['clear', 'tight', 'over', 'unknown'];

/** Lines by which the verdicts are told apart without colour; clear has none. */
const HATCHES: Readonly<Record<Exclude<Verdict, 'clear'>, string>> = {
  tight: 'M0 7 7 0',
  over: 'M-1 1 1 -1M0 5 5 0M4 6 6 4',
  unknown: 'M0 2.5h5',
};
const HATCH_SIZES: Readonly<Record<Exclude<Verdict, 'clear'>, number>> = { tight: 7, over: 5, unknown: 5 };

export const fadeOf = (verdict: Verdict): string => `url(#lane-fade-${verdict})`;
export const hatchOf = (verdict: Verdict): string => (verdict === 'clear' ? 'none' : `url(#lane-hatch-${verdict})`);

/** Gradients and hatches of all lanes and purses, once a page. Not `display: none`: that would switch them off. */
export function LaneDefs() {
  return (
    <svg width="0" height="0" style={{ position: 'absolute' }} aria-hidden="true" focusable="false">
      <defs>
        {VERDICTS.map((verdict) => (
          <linearGradient key={verdict} id={`lane-fade-${verdict}`}>
            <stop offset="0" stopColor={`var(--${verdict})`} stopOpacity="0.85" />
            <stop offset="1" stopColor={`var(--${verdict})`} stopOpacity="0.12" />
          </linearGradient>
        ))}
        {(['tight', 'over', 'unknown'] as const).map((verdict) => (
          <pattern
            key={verdict}
            id={`lane-hatch-${verdict}`}
            width={HATCH_SIZES[verdict]}
            height={HATCH_SIZES[verdict]}
            patternUnits="userSpaceOnUse"
          >
            <path d={HATCHES[verdict]} stroke="var(--paper)" strokeWidth="1.2" strokeOpacity="0.55" fill="none" />
          </pattern>
        ))}
      </defs>
    </svg>
  );
}
