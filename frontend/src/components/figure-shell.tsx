import type { ReactNode } from 'react';

import styles from './figure-text.module.css';

interface FigureShellProps {
  className: string;
  /** Hover text. */
  hint: string | undefined;
  /** What is read out when the figure opens its working. */
  spoken: string;
  onOpen: (() => void) | undefined;
  children: ReactNode;
}

/** A figure as plain text, or as a button that opens its working. */
export function FigureShell({ className, hint, spoken, onOpen, children }: FigureShellProps) {
  if (!onOpen) {
    return (
      <span className={className} title={hint}>
        {children}
      </span>
    );
  }
  return (
    <button
      type="button"
      className={`${className} ${styles.button}`}
      title={hint ? `${hint} · show the working` : 'Show the working'}
      aria-label={`${spoken}, show the working`}
      onClick={(event) => {
        // The row behind has a click of its own.
        event.stopPropagation();
        onOpen();
      }}
    >
      {children}
    </button>
  );
}

/** The classes that are given, joined. */
export function classNames(...names: readonly (string | false | null | undefined)[]): string {
  return names.filter(Boolean).join(' ');
}
