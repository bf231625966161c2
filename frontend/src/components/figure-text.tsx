import type { Figure, Verdict } from '../api/types';
import { formatFigure, otherNotation } from '../lib/format-figure';
import styles from './figure-text.module.css';

export interface FigureTextProps {
  figure: Figure;
  /** What the figure is, for screen readers and the hover text: "noise gain of S2". */
  name?: string;
  /** Opens the working. Without it the figure is plain text. */
  onOpen?: () => void;
  tone?: Verdict;
  strong?: boolean;
  /** Leaves the unit out (it stands in the column's head). Ratio and gain signs stay. */
  hideUnit?: boolean;
  className?: string;
}

/** On hover: the other notation, what was assumed, or why there is no figure. */
export function figureHint(figure: Figure): string | undefined {
  if (figure.value === null) return figure.reason;
  const parts = [otherNotation(figure), figure.assumed ? 'a value was assumed' : null];
  const hint = parts.filter((part) => part !== null).join(' · ');
  return hint === '' ? undefined : hint;
}

/** A figure with SI prefix and unit in tabular numerals; a dash with its reason when there is none. */
export function FigureText({ figure, name, onOpen, tone, strong, hideUnit, className }: FigureTextProps) {
  const { text, number } = formatFigure(figure);
  const shown = hideUnit && figure.unit !== 'fraction' ? number : text;
  const hint = figureHint(figure);
  const classes = [
    styles.figure,
    tone ? styles[tone] : '',
    strong ? styles.strong : '',
    figure.value === null ? styles.missing : '',
    className ?? '',
  ].join(' ');
  const content = (
    <>
      {shown}
      {figure.assumed && figure.value !== null && (
        <span className={styles.assumed} aria-hidden="true">
          ~
        </span>
      )}
      {figure.value === null && <span className="visually-hidden"> not known: {figure.reason}</span>}
    </>
  );
  if (!onOpen) {
    return (
      <span className={classes} title={hint}>
        {content}
      </span>
    );
  }
  return (
    <button
      type="button"
      className={`${classes} ${styles.button}`}
      title={hint ? `${hint} · show the working` : 'Show the working'}
      aria-label={`${name ?? 'Figure'} ${figure.value === null ? (figure.reason ?? 'not known') : text}, show the working`}
      onClick={(event) => {
        event.stopPropagation();
        onOpen();
      }}
    >
      {content}
    </button>
  );
}
