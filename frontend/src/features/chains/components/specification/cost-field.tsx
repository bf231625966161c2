import { useState } from 'react';

import { TextField } from '../../../../components/text-field';
import { formatMicros, parsePrice } from '../../../../lib/money';

interface CostFieldProps {
  currency: string;
  value: number | null;
  onChange: (micros: number | null) => void;
  error?: string | null;
  disabled?: boolean;
}

interface Typed {
  readonly text: string;
  readonly micros: number | null;
  readonly message: string | null;
}

function textOf(micros: number | null, currency: string): string {
  return micros === null ? '' : formatMicros(micros, currency);
}

function read(text: string, present: number | null): Typed {
  if (text.trim() === '') return { text, micros: null, message: null };
  const parsed = parsePrice(text);
  return parsed.ok
    ? { text, micros: parsed.micros, message: null }
    : { text, micros: present, message: parsed.message };
}

/** A limit in money: whole micro-units behind what is typed. */
export function CostField({ currency, value, onChange, error, disabled }: CostFieldProps) {
  const [typed, setTyped] = useState<Typed>({ text: textOf(value, currency), micros: value, message: null });
  const current = typed.micros === value ? typed : { text: textOf(value, currency), micros: value, message: null };
  const change = (text: string) => {
    const next = read(text, value);
    setTyped(next);
    if (next.message === null && next.micros !== value) onChange(next.micros);
  };
  return (
    <TextField
      label={`Cost per board at most, ${currency}`}
      value={current.text}
      placeholder="not required"
      disabled={disabled}
      error={current.message ?? error}
      onChange={change}
    />
  );
}
