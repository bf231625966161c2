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
import { describedBy, errorId, Field } from './field';
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

interface QuantityText {
  readonly text: string;
  /** What the field itself complains about. */
  readonly ownMessage: string | null;
  /** "= 4.70 kΩ" where what was typed says it otherwise. */
  readonly understood: string | null;
  readonly accept: (text: string) => void;
}

/** What is typed beside the value that it stands for. */
function useQuantityText(props: QuantityInputProps): QuantityText {
  const { unit, onChange } = props;
  const value = props.value ?? null;
  const shown = (): Typed => ({ text: toFieldText(value, unit), value, message: null });
  const [typed, setTyped] = useState<Typed>(shown);
  // Somebody else changed the value (undo, snapping, another row): show that instead of what was typed.
  const current = Object.is(typed.value, value) ? typed : shown();
  const translated = current.message === null && value !== null && needsTranslation(current.text, value, unit);
  return {
    text: current.text,
    ownMessage: current.message,
    understood: translated ? `= ${describeQuantity(value, unit)}` : null,
    accept: (text) => {
      const next = readTyped(text, props);
      setTyped(next);
      if (next.message === null && !Object.is(next.value, value)) onChange(next.value);
    },
  };
}

/**
 * A field for a quantity in engineering notation. Keeps what was typed, says what it understood, and names the limit
 * that was broken. A form finds an unreadable field by `data-unreadable`.
 */
export function QuantityInput(props: QuantityInputProps) {
  const generatedId = useId();
  const id = props.id ?? generatedId;
  const quantity = useQuantityText(props);
  const message = quantity.ownMessage ?? props.error ?? null;
  const hint = message ? null : (quantity.understood ?? props.hint);
  const control = <QuantityControl {...props} id={id} quantity={quantity} message={message} hint={hint} />;
  if (props.bare) {
    return (
      <BareControl id={id} message={message}>
        {control}
      </BareControl>
    );
  }
  return (
    <Field id={id} label={props.label} required={props.required && !props.quietRequired} error={message} hint={hint}>
      {control}
    </Field>
  );
}

/** In a bare field the label is nowhere to be seen. */
function spokenName({ bare, ariaLabel, label }: QuantityInputProps): string | undefined {
  return bare ? (ariaLabel ?? String(label)) : ariaLabel;
}

interface QuantityControlProps extends QuantityInputProps {
  id: string;
  quantity: QuantityText;
  message: string | null;
}

function QuantityControl({ id, quantity, message, hint, ...props }: QuantityControlProps) {
  const described = describedBy(id, message, props.bare ? null : hint);
  return (
    <Input
      id={id}
      className={styles.input}
      value={quantity.text}
      onChange={(event) => quantity.accept(event.target.value)}
      onBlur={props.onBlur}
      placeholder={props.placeholder}
      disabled={props.disabled}
      autoFocus={props.autoFocus}
      autoComplete="off"
      spellCheck={false}
      status={message ? 'error' : undefined}
      aria-invalid={message ? true : undefined}
      data-unreadable={quantity.ownMessage ? true : undefined}
      aria-required={props.required || undefined}
      aria-label={spokenName(props)}
      aria-describedby={described}
      title={props.bare ? (quantity.understood ?? undefined) : undefined}
      suffix={<span className={styles.unit}>{props.suffix ?? unitLabel(props.unit)}</span>}
    />
  );
}

function BareControl({ id, message, children }: { id: string; message: string | null; children: ReactNode }) {
  return (
    <div className={styles.bare}>
      {children}
      {message && (
        <div id={errorId(id)} className={styles.bareError} role="alert">
          {message}
        </div>
      )}
    </div>
  );
}
