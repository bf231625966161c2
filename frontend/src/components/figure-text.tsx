import type { Figure, Verdict } from '../api/types';
import { formatFigure, otherNotation } from '../lib/format-figure';
import { classNames, FigureShell } from './figure-shell';
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
export function FigureText({ figure, name = 'Figure', onOpen, tone, strong, hideUnit, className }: FigureTextProps) {
  const { text, number } = formatFigure(figure);
  const known = figure.value !== null;
  const shown = hideUnit && figure.unit !== 'fraction' ? number : text;
  const classes = classNames(
    styles.figure,
    tone && styles[tone],
    strong && styles.strong,
    !known && styles.missing,
    className,
  );
  return (
    <FigureShell
      className={classes}
      hint={figureHint(figure)}
      spoken={`${name} ${known ? text : (figure.reason ?? 'not known')}`}
      onOpen={onOpen}
    >
      {shown}
      <FigureRemark figure={figure} />
    </FigureShell>
  );
}

/** A tilde where a value was assumed; for screen readers, why there is no figure. */
function FigureRemark({ figure }: { figure: Figure }) {
  if (figure.value === null) return <span className="visually-hidden"> not known: {figure.reason}</span>;
  if (!figure.assumed) return null;
  return (
    <span className={styles.assumed} aria-hidden="true">
      ~
    </span>
  );
}
