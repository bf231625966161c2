import { Input } from 'antd';

import { describedBy, Field } from '../../../components/field';

interface TextFieldProps {
  id: string;
  label: string;
  value: string;
  onChange: (value: string) => void;
  error?: string | null;
  hint?: string;
  autoComplete?: string;
  autoFocus?: boolean;
}

export function EmailField(props: TextFieldProps) {
  const { id, label, value, onChange, error, hint, autoFocus } = props;
  return (
    <Field id={id} label={label} error={error} hint={hint}>
      <Input
        id={id}
        type="email"
        value={value}
        autoComplete={props.autoComplete ?? 'username'}
        autoFocus={autoFocus}
        required
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, error, hint)}
        onChange={(event) => onChange(event.target.value)}
      />
    </Field>
  );
}

export function PasswordField(props: TextFieldProps) {
  const { id, label, value, onChange, error, hint, autoFocus } = props;
  return (
    <Field id={id} label={label} error={error} hint={hint}>
      <Input.Password
        id={id}
        value={value}
        autoComplete={props.autoComplete ?? 'current-password'}
        autoFocus={autoFocus}
        required
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, error, hint)}
        onChange={(event) => onChange(event.target.value)}
      />
    </Field>
  );
}
