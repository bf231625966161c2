import { Input } from 'antd';
import { useId, useState, type ReactNode } from 'react';

import {
  describeQuantity,
  limitMessage,
  parseInUnit,
  toFieldText,
  unitLabel,
  type QuantityLimits,
  type QuantityUnit,
} from '../lib/quantity-units';
import { describedBy, Field } from './field';
import styles from './quantity-input.module.css';

export interface QuantityInputProps extends QuantityLimits {
  label: ReactNode;
  /** Accessible name where `label` is short or hidden. */
  ariaLabel?: string;
  /** Shown inside the field; a bare number counts in it. `value` is always in the SI base unit. */
  unit: QuantityUnit;
  value: number | null | undefined;
  /** Called with every readable value within the limits; null when the field is emptied and not required. */
  onChange: (value: number | null) => void;
  required?: boolean;
  /** In dense places: needed, but not said in the label. */
  quietRequired?: boolean;
  /** From the server, or from the form: shown when the field itself has nothing to complain about. */
  error?: string | null;
  hint?: ReactNode;
  /** Text at the right of the field instead of the unit, e.g. "nF → 159 kHz". */
  suffix?: ReactNode;
  placeholder?: string;
  disabled?: boolean;
  id?: string;
  /** Only the control: the label becomes its accessible name (tables, dense rows). */
  bare?: boolean;
  onBlur?: () => void;
  autoFocus?: boolean;
}

interface Typed {
  readonly text: string;
  /** The value that this text stood for when it was typed. */
  readonly value: number | null;
  readonly message: string | null;
}

function readTyped(text: string, props: QuantityInputProps): Typed {
  const { unit, required, value } = props;
  if (text.trim() === '') {
    return required ? { text, value: value ?? null, message: 'Needed.' } : { text, value: null, message: null };
  }
  const parsed = parseInUnit(text, unit);
  if (!parsed.ok) return { text, value: value ?? null, message: parsed.message };
  const message = limitMessage(parsed.value, unit, props);
  return { text, value: message === null ? parsed.value : (value ?? null), message };
}

/** True when what was typed says more than the bare number in the field's own unit. */
function needsTranslation(text: string, value: number, unit: QuantityUnit): boolean {
  return text.trim() !== '' && text.trim().replace('-', '−') !== toFieldText(value, unit) && Number.isFinite(value);
}

/**
 * A field for a quantity in engineering notation. Keeps what was typed, says what it understood, and names the limit
 * that was broken. A form finds an unreadable field by `aria-invalid`.
 */
export function QuantityInput(props: QuantityInputProps) {
  const { label, ariaLabel, unit, onChange, required, error, hint, suffix, placeholder, disabled, bare, onBlur } =
    props;
  const generatedId = useId();
  const id = props.id ?? generatedId;
  const value = props.value ?? null;
  const [typed, setTyped] = useState<Typed>(() => ({ text: toFieldText(value, unit), value, message: null }));

  // Somebody else changed the value (undo, snapping, another row): show that instead of what was typed.
  const current: Typed = Object.is(typed.value, value)
    ? typed
    : { text: toFieldText(value, unit), value, message: null };

  const accept = (text: string): void => {
    const next = readTyped(text, props);
    setTyped(next);
    if (next.message === null && !Object.is(next.value, value)) onChange(next.value);
  };

  const message = current.message ?? error ?? null;
  const understood =
    message === null && value !== null && needsTranslation(current.text, value, unit)
      ? `= ${describeQuantity(value, unit)}`
      : null;
  const control = (
    <Input
      id={id}
      className={styles.input}
      value={current.text}
      onChange={(event) => accept(event.target.value)}
      onBlur={onBlur}
      placeholder={placeholder}
      disabled={disabled}
      autoFocus={props.autoFocus}
      inputMode="text"
      autoComplete="off"
      spellCheck={false}
      status={message ? 'error' : undefined}
      aria-invalid={message ? true : undefined}
      data-unreadable={current.message ? true : undefined}
      aria-required={required || undefined}
      aria-label={bare ? (ariaLabel ?? String(label)) : ariaLabel}
      aria-describedby={bare ? undefined : describedBy(id, message, understood ?? hint)}
      title={bare ? (message ?? understood ?? undefined) : undefined}
      suffix={<span className={styles.unit}>{suffix ?? unitLabel(unit)}</span>}
    />
  );
  if (bare) return <BareControl message={message}>{control}</BareControl>;
  return (
    <Field id={id} label={label} required={required && !props.quietRequired} error={message} hint={understood ?? hint}>
      {control}
    </Field>
  );
}

function BareControl({ message, children }: { message: string | null; children: ReactNode }) {
  return (
    <div className={styles.bare}>
      {children}
      {message && (
        <div className={styles.bareError} role="alert">
          {message}
        </div>
      )}
    </div>
  );
}
