import { useQuery } from '@tanstack/react-query';
import { Navigate, useSearchParams } from 'react-router-dom';

import type { Session } from '../../api/types';
import { ErrorNotice } from '../../components/error-notice';
import { DemoPeople } from '../../features/session/components/demo-people';
import { SessionCard } from '../../features/session/components/session-card';
import { SignInForm } from '../../features/session/components/sign-in-form';
import { sessionQuery } from '../../features/session/queries';
import { PageSkeleton } from '../layout/page-skeleton';

/** Only addresses of this site: `//elsewhere` would leave it. */
const ownPath = (path: string | null): string => (path && /^\/(?![/\\])/.test(path) ? path : '/');

export function Component() {
  const [params] = useSearchParams();
  const { data: session, error, refetch } = useQuery(sessionQuery());
  if (session) return <SignInPage session={session} from={ownPath(params.get('from'))} />;
  if (!error) return <PageSkeleton />;
  return (
    <SessionCard title="Sign in">
      <ErrorNotice error={error} onRetry={() => void refetch()} />
    </SessionCard>
  );
}

function SignInPage({ session, from }: { session: Session; from: string }) {
  if (session.user) return <Navigate to={from} replace />;
  if (session.setupNeeded) return <Navigate to="/setup" replace />;
  const offersDemo = session.demoAccounts.length > 0;
  return (
    <SessionCard title="Sign in">
      {offersDemo && <DemoPeople accounts={session.demoAccounts} />}
      {offersDemo && <h2>With an account of your own</h2>}
      <SignInForm autoFocus={!offersDemo} />
    </SessionCard>
  );
}
