import { Button, Input } from 'antd';
import { useState, type FormEvent } from 'react';

import { fieldMessages, isApiError } from '../../../api/api-error';
import { describedBy, Field } from '../../../components/field';
import { ErrorNotice } from '../../../components/error-notice';
import { useSetUp } from '../mutations';
import { EmailField } from './credential-fields';
import { NewPasswordFields, newPasswordProblem } from './new-password';
import styles from './session-card.module.css';

/** First start: whoever holds the setup token becomes the first administrator. */
export function SetUpForm({ initialToken }: { initialToken: string }) {
  const [token, setToken] = useState(initialToken);
  const [name, setName] = useState('');
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState({ first: '', second: '' });
  const [tried, setTried] = useState(false);
  const setUp = useSetUp();
  const messages = fieldMessages(setUp.error);
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    setTried(true);
    if (newPasswordProblem(password)) return;
    setUp.mutate({ token: token.trim(), name: name.trim(), email: email.trim(), password: password.first });
  };
  const general = setUp.error && Object.keys(messages).length === 0 ? setUp.error : null;
  return (
    <form className={styles.form} onSubmit={submit} noValidate>
      <p className="soft">The setup token stands in the server’s output. It works once, for the first administrator.</p>
      {isApiError(general, 404) ? (
        <p role="alert" className={styles.refused}>
          This token is not valid, or the setup is already done.
        </p>
      ) : (
        <ErrorNotice error={general} />
      )}
      <Field id="setup-token" label="Setup token" error={messages['token']}>
        <Input id="setup-token" value={token} required autoComplete="off" onChange={(e) => setToken(e.target.value)} />
      </Field>
      <Field id="setup-name" label="Your name" error={messages['name']}>
        <Input
          id="setup-name"
          value={name}
          required
          maxLength={120}
          autoComplete="name"
          aria-describedby={describedBy('setup-name', messages['name'], null)}
          onChange={(event) => setName(event.target.value)}
        />
      </Field>
      <EmailField id="setup-email" label="E-mail address" value={email} onChange={setEmail} error={messages['email']} />
      <NewPasswordFields value={password} onChange={setPassword} tried={tried} error={messages['password']} />
      <Button type="primary" htmlType="submit" loading={setUp.isPending}>
        Create the first administrator
      </Button>
    </form>
  );
}
