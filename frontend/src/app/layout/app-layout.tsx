import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useEffect, useState, useSyncExternalStore } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router-dom';

import type { Session } from '../../api/types';
import { ErrorNotice } from '../../components/error-notice';
import { Page } from '../../components/page';
import { SessionUserContext } from '../../components/session-context';
import { isTyping } from '../../components/shortcuts';
import { sessionQuery } from '../../features/session/queries';
import { signedOutStore } from '../signed-out-store';
import styles from './app-layout.module.css';
import { PageSkeleton } from './page-skeleton';
import { TopBar } from './top-bar';

const ShortcutsHelp = lazy(async () => ({
  default: (await import('../../components/shortcuts-help')).ShortcutsHelp,
}));
const SignInAgain = lazy(async () => ({
  default: (await import('../../features/session/components/sign-in-again')).SignInAgain,
}));

/** Bar on top, page below; sends whoever is not signed in to the sign-in page and back again. */
export function AppLayout() {
  const { data: session, error, refetch } = useQuery(sessionQuery());
  const location = useLocation();
  if (!session) {
    if (!error) return <PageSkeleton />;
    return (
      <Page>
        <ErrorNotice error={error} onRetry={() => void refetch()} />
      </Page>
    );
  }
  if (!session.user) {
    if (session.setupNeeded) return <Navigate to="/setup" replace />;
    const from = `${location.pathname}${location.search}`;
    return <Navigate to={from === '/' ? '/sign-in' : `/sign-in?from=${encodeURIComponent(from)}`} replace />;
  }
  return <SignedInLayout session={session} />;
}

function SignedInLayout({ session }: { session: Session }) {
  const [helpOpen, setHelpOpen] = useQuestionMark();
  const signedOut = useSyncExternalStore(signedOutStore.subscribe, signedOutStore.get);
  return (
    <SessionUserContext value={session.user}>
      <a className={styles.skip} href="#content">
        Skip to content
      </a>
      <TopBar onHelp={() => setHelpOpen(true)} />
      <main id="content" tabIndex={-1} className={styles.main}>
        <Outlet />
      </main>
      <Suspense fallback={null}>
        {helpOpen && <ShortcutsHelp open onClose={() => setHelpOpen(false)} />}
        {signedOut && <SignInAgain session={session} onDone={() => signedOutStore.set(false)} />}
      </Suspense>
    </SessionUserContext>
  );
}

/** `?` opens the list of shortcuts, unless somebody types. */
function useQuestionMark(): [boolean, (open: boolean) => void] {
  const [open, setOpen] = useState(false);
  useEffect(() => {
    const onKey = (event: KeyboardEvent): void => {
      if (event.key !== '?' || event.ctrlKey || event.metaKey || isTyping(event.target)) return;
      event.preventDefault();
      setOpen(true);
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);
  return [open, setOpen];
}
