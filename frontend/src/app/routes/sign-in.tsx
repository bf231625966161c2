import { useQuery } from '@tanstack/react-query';
import { Navigate, useSearchParams } from 'react-router-dom';

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
  if (session?.user) return <Navigate to={ownPath(params.get('from'))} replace />;
  if (session?.setupNeeded) return <Navigate to="/setup" replace />;
  if (!session && !error) return <PageSkeleton />;
  return (
    <SessionCard title="Sign in">
      <ErrorNotice error={session ? null : error} onRetry={() => void refetch()} />
      {session?.demo && session.demoAccounts.length > 0 && <DemoPeople accounts={session.demoAccounts} />}
      <SignInForm />
    </SessionCard>
  );
}
