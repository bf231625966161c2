import { useState } from 'react';

import { PasswordField } from './credential-fields';

export const MINIMUM_PASSWORD_LENGTH = 10;

export interface NewPassword {
  readonly first: string;
  readonly second: string;
}

/** What is wrong with a password typed twice; null = nothing. */
export function newPasswordProblem({ first, second }: NewPassword): { first?: string; second?: string } | null {
  if (first.length < MINIMUM_PASSWORD_LENGTH) {
    return { first: `At least ${MINIMUM_PASSWORD_LENGTH} characters; this has ${first.length}.` };
  }
  return first === second ? null : { second: 'The two passwords differ.' };
}

interface NewPasswordFieldsProps {
  value: NewPassword;
  onChange: (value: NewPassword) => void;
  /** From the server. */
  error?: string;
  /** Show what is wrong (after the first try to submit). */
  tried: boolean;
}

export function NewPasswordFields({ value, onChange, error, tried }: NewPasswordFieldsProps) {
  const [left, setLeft] = useState(false);
  const problem = newPasswordProblem(value);
  return (
    <>
      <PasswordField
        id="new-password"
        label="New password"
        hint={`At least ${MINIMUM_PASSWORD_LENGTH} characters.`}
        autoComplete="new-password"
        value={value.first}
        onChange={(first) => onChange({ ...value, first })}
        error={(tried ? problem?.first : undefined) ?? error}
      />
      <div onBlur={() => setLeft(true)}>
        <PasswordField
          id="new-password-again"
          label="Once more"
          autoComplete="new-password"
          value={value.second}
          onChange={(second) => onChange({ ...value, second })}
          error={tried || left ? problem?.second : undefined}
        />
      </div>
    </>
  );
}
