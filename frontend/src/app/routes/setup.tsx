import { useQuery } from '@tanstack/react-query';
import { Navigate, useSearchParams } from 'react-router-dom';

import { SessionCard } from '../../features/session/components/session-card';
import { SetUpForm } from '../../features/session/components/set-up-form';
import { sessionQuery } from '../../features/session/queries';

export function Component() {
  const [params] = useSearchParams();
  const { data: session } = useQuery(sessionQuery());
  if (session?.user) return <Navigate to="/" replace />;
  if (session && !session.setupNeeded) return <Navigate to="/sign-in" replace />;
  return (
    <SessionCard title="Set up">
      <SetUpForm initialToken={params.get('token') ?? ''} />
    </SessionCard>
  );
}
