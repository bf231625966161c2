import type { DemoAccount } from '../../../api/types';
import { ErrorNotice } from '../../../components/error-notice';
import { useDemoSignIn } from '../mutations';
import styles from './session-card.module.css';

/** One click signs in as one of the invented people, so that each role can be looked at. */
export function DemoPeople({ accounts, onDone }: { accounts: readonly DemoAccount[]; onDone?: () => void }) {
  const signIn = useDemoSignIn();
  return (
    <section aria-labelledby="demo-people">
      <h2 id="demo-people">Demo team</h2>
      <p className="soft">This is the demo: people, parts and prices are invented. Choose whom to be.</p>
      <ErrorNotice error={signIn.error} />
      <ul className={styles.people}>
        {accounts.map((account) => (
          <li key={account.userId}>
            <button
              type="button"
              className={styles.person}
              disabled={signIn.isPending}
              onClick={() => signIn.mutate(account.userId, { onSuccess: () => onDone?.() })}
            >
              <span className={styles.personName}>{account.name}</span>
              <span className={styles.personRole}>{account.roles.join(', ')}</span>
              <span className={styles.personTitle}>{account.title}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
