import type { ReactNode } from 'react';

import styles from './field.module.css';

export interface FieldProps {
  /** Id of the control inside. */
  id: string;
  label: ReactNode;
  required?: boolean;
  /** In words; replaces the hint. */
  error?: string | null;
  hint?: ReactNode;
  children: ReactNode;
  className?: string;
}

export const errorId = (id: string): string => `${id}-error`;
export const hintId = (id: string): string => `${id}-hint`;

/** What the control inside needs so that its messages are read out. */
export function describedBy(id: string, error: unknown, hint: unknown): string | undefined {
  if (error) return errorId(id);
  return hint ? hintId(id) : undefined;
}

/** Label above, control, and under it the error in words (or a hint). */
export function Field({ id, label, required, error, hint, children, className }: FieldProps) {
  return (
    <div className={`${styles.field} ${className ?? ''}`}>
      <label htmlFor={id} className={styles.label}>
        {label}
        {required && <span className={styles.required}> (required)</span>}
      </label>
      {children}
      {error ? (
        <div id={errorId(id)} className={styles.error} role="alert">
          {error}
        </div>
      ) : (
        hint && (
          <div id={hintId(id)} className={styles.hint}>
            {hint}
          </div>
        )
      )}
    </div>
  );
}
