import { useId, type ReactNode } from 'react';

import { describedBy, Field } from './field';
import styles from './select-field.module.css';

export interface SelectOption<T extends string> {
  readonly value: T;
  readonly label: string;
}

export interface SelectFieldProps<T extends string> {
  label: ReactNode;
  value: T | '';
  options: readonly SelectOption<T>[];
  onChange: (value: T) => void;
  /** An extra first entry with the value ''. */
  emptyLabel?: string;
  onEmpty?: () => void;
  id?: string;
  required?: boolean;
  error?: string | null;
  hint?: ReactNode;
  disabled?: boolean;
  className?: string;
}

/** The platform's own list: it works with every keyboard, screen reader and phone. */
export function SelectField<T extends string>(props: SelectFieldProps<T>) {
  const { label, value, options, onChange, emptyLabel, onEmpty, required, error, hint, disabled, className } = props;
  const generatedId = useId();
  const id = props.id ?? generatedId;
  const choose = (chosen: string): void => {
    const option = options.find((candidate) => candidate.value === chosen);
    if (option) onChange(option.value);
    else onEmpty?.();
  };
  return (
    <Field id={id} label={label} required={required} error={error} hint={hint} className={className}>
      <select
        id={id}
        className={styles.select}
        value={value}
        disabled={disabled}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, error, hint)}
        onChange={(event) => choose(event.target.value)}
      >
        {emptyLabel !== undefined && <option value="">{emptyLabel}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </Field>
  );
}
