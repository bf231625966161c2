import { useQuery } from '@tanstack/react-query';
import { Link, Navigate, useParams } from 'react-router-dom';

import { isApiError } from '../../api/api-error';
import { ErrorNotice } from '../../components/error-notice';
import { SessionCard } from '../../features/session/components/session-card';
import { WelcomeForm } from '../../features/session/components/welcome-form';
import { oneTimeLinkQuery, sessionQuery } from '../../features/session/queries';

export function Component() {
  const { token = '' } = useParams();
  const { data: session, isPending } = useQuery(sessionQuery());
  // Whoever is signed in goes on to the desk: a link that has just been used is not asked for again.
  const asked = !isPending && !session?.user;
  const { data: link, error, refetch } = useQuery({ ...oneTimeLinkQuery(token), enabled: asked });
  if (session?.user) return <Navigate to="/" replace />;
  const spent = isApiError(error, 404);
  return (
    <SessionCard title="Choose a password">
      {spent && (
        <p role="alert">
          This link was used already or has expired. Ask an administrator for a new one, or{' '}
          <Link to="/sign-in">sign in</Link>.
        </p>
      )}
      {!spent && <ErrorNotice error={error} onRetry={() => void refetch()} />}
      {link && <WelcomeForm token={token} link={link} />}
    </SessionCard>
  );
}
