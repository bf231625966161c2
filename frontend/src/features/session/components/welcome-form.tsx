import { Button } from 'antd';
import { useState, type FormEvent } from 'react';

import { fieldMessages } from '../../../api/api-error';
import { ErrorNotice } from '../../../components/error-notice';
import { useSetPassword } from '../mutations';
import type { OneTimeLink } from '../queries';
import { NewPasswordFields, newPasswordProblem } from './new-password';
import styles from './session-card.module.css';

export function WelcomeForm({ token, link }: { token: string; link: OneTimeLink }) {
  const [password, setPassword] = useState({ first: '', second: '' });
  const [tried, setTried] = useState(false);
  const setOnServer = useSetPassword(token);
  const messages = fieldMessages(setOnServer.error);
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    setTried(true);
    if (newPasswordProblem(password)) return;
    setOnServer.mutate(password.first);
  };
  return (
    <form className={styles.form} onSubmit={submit} noValidate>
      <p>
        Welcome, {link.name}. Choose a password for <strong>{link.email}</strong>; you are signed in right after.
      </p>
      <ErrorNotice error={messages['password'] ? null : setOnServer.error} />
      <input type="hidden" name="username" autoComplete="username" value={link.email} readOnly />
      <NewPasswordFields value={password} onChange={setPassword} tried={tried} error={messages['password']} />
      <Button type="primary" htmlType="submit" loading={setOnServer.isPending}>
        Set the password and sign in
      </Button>
    </form>
  );
}
