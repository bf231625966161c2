import { Modal } from 'antd';

import type { Session } from '../../../api/types';
import { DemoPeople } from './demo-people';
import { SignInForm } from './sign-in-form';

/** Over the page on which the session lapsed: what is typed there stays. */
export function SignInAgain({ session, onDone }: { session: Session; onDone: () => void }) {
  return (
    <Modal open title="Your session has ended" footer={null} closable={false} mask={{ closable: false }} width={420}>
      <p className="soft" style={{ marginBottom: 12 }}>
        Sign in again to go on. The page behind keeps what you typed.
      </p>
      <SignInForm autoFocus initialEmail={session.user?.email} onDone={onDone} />
      {session.demo && <DemoPeople accounts={session.demoAccounts} onDone={onDone} />}
    </Modal>
  );
}
