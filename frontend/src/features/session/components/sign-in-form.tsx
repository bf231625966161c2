import { Button } from 'antd';
import { useState, type FormEvent } from 'react';

import { isApiError } from '../../../api/api-error';
import { ErrorNotice } from '../../../components/error-notice';
import { useSignIn } from '../mutations';
import { EmailField, PasswordField } from './credential-fields';
import styles from './session-card.module.css';

interface SignInFormProps {
  initialEmail?: string;
  onDone?: () => void;
  autoFocus?: boolean;
}

export function SignInForm({ initialEmail = '', onDone, autoFocus }: SignInFormProps) {
  const [email, setEmail] = useState(initialEmail);
  const [password, setPassword] = useState('');
  const signIn = useSignIn();
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    signIn.mutate({ email: email.trim(), password }, { onSuccess: () => onDone?.() });
  };
  const refused = isApiError(signIn.error, 401);
  return (
    <form className={styles.form} onSubmit={submit}>
      {refused && (
        <p role="alert" className={styles.refused}>
          E-mail address and password do not match an active account.
        </p>
      )}
      {!refused && <ErrorNotice error={signIn.error} />}
      <EmailField id="sign-in-email" label="E-mail address" value={email} onChange={setEmail} autoFocus={autoFocus} />
      <PasswordField id="sign-in-password" label="Password" value={password} onChange={setPassword} />
      <Button type="primary" htmlType="submit" loading={signIn.isPending}>
        Sign in
      </Button>
    </form>
  );
}
