import { Input } from 'antd';
import { useId, type ReactNode } from 'react';

import { describedBy, Field } from './field';

export interface TextFieldProps {
  label: ReactNode;
  value: string;
  onChange: (value: string) => void;
  id?: string;
  required?: boolean;
  error?: string | null;
  hint?: ReactNode;
  /** A longer text stays as it was typed or pasted, and the field says so. */
  maxLength?: number;
  placeholder?: string;
  multiline?: boolean;
  disabled?: boolean;
  autoFocus?: boolean;
  type?: 'text' | 'email' | 'date' | 'search';
  /** Suggestions that may be typed over. */
  suggestions?: readonly string[];
  className?: string;
}

/** In code points, as the server counts, so that an emoji is one character. */
function tooLong({ value, maxLength }: TextFieldProps): string | null {
  if (maxLength === undefined || value.length <= maxLength) return null;
  const length = [...value].length;
  return length > maxLength ? `At most ${maxLength} characters; this has ${length}.` : null;
}

export function TextField(props: TextFieldProps) {
  const { label, value, onChange, required, hint, multiline, suggestions, className } = props;
  const error = tooLong(props) ?? props.error;
  const generatedId = useId();
  const id = props.id ?? generatedId;
  const shared = {
    id,
    value,
    placeholder: props.placeholder,
    disabled: props.disabled,
    autoFocus: props.autoFocus,
    status: error ? ('error' as const) : undefined,
    'aria-invalid': error ? true : undefined,
    'aria-required': required || undefined,
    'aria-describedby': describedBy(id, error, hint),
  };
  return (
    <Field id={id} label={label} required={required} error={error} hint={hint} className={className}>
      {multiline ? (
        <Input.TextArea {...shared} autoSize={{ minRows: 2, maxRows: 10 }} onChange={(e) => onChange(e.target.value)} />
      ) : (
        <Input
          {...shared}
          type={props.type ?? 'text'}
          list={suggestions ? `${id}-list` : undefined}
          autoComplete="off"
          onChange={(event) => onChange(event.target.value)}
        />
      )}
      {suggestions && (
        <datalist id={`${id}-list`}>
          {suggestions.map((suggestion) => (
            <option key={suggestion} value={suggestion} />
          ))}
        </datalist>
      )}
    </Field>
  );
}
