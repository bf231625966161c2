import { useEffect, useRef, useState, type RefObject } from 'react';
import { Link, useLocation } from 'react-router-dom';

import type { SessionUser } from '../../api/types';
import { useSessionUser } from '../../components/session-context';
import { useSignOut } from '../../features/session/mutations';
import { useTheme, type ThemeChoice } from '../theme/theme-context';
import styles from './user-menu.module.css';

const CHOICES: readonly (readonly [ThemeChoice, string])[] = [
  ['system', 'As the system'],
  ['light', 'Light'],
  ['dark', 'Dark'],
];

const initials = (name: string): string =>
  name
    .split(/\s+/)
    .map((word) => word[0] ?? '')
    .join('')
    .slice(0, 2);

/** Closes on Escape (focus goes back to the button) and on a click elsewhere. */
function useDismiss(open: boolean, close: () => void, box: RefObject<HTMLElement | null>): void {
  useEffect(() => {
    if (!open) return undefined;
    const onKey = (event: KeyboardEvent): void => {
      if (event.key !== 'Escape') return;
      close();
      box.current?.querySelector('button')?.focus();
    };
    const onPointer = (event: PointerEvent): void => {
      if (event.target instanceof Node && !box.current?.contains(event.target)) close();
    };
    document.addEventListener('keydown', onKey);
    document.addEventListener('pointerdown', onPointer);
    return () => {
      document.removeEventListener('keydown', onKey);
      document.removeEventListener('pointerdown', onPointer);
    };
  }, [open, close, box]);
}

export function UserMenu() {
  const user = useSessionUser();
  const { pathname } = useLocation();
  const [openAt, setOpenAt] = useState<string | null>(null);
  const open = openAt === pathname;
  const box = useRef<HTMLDivElement>(null);
  useDismiss(open, () => setOpenAt(null), box);
  return (
    <div className={styles.box} ref={box}>
      <button
        type="button"
        className={styles.trigger}
        aria-expanded={open}
        aria-controls="user-menu"
        aria-label={`${user.name}, ${user.roles.join(', ')}: settings and sign out`}
        onClick={() => setOpenAt(open ? null : pathname)}
      >
        <span className={styles.wide}>
          {user.name} <span className="soft">· {user.roles.join(', ')}</span>
        </span>
        <span className={styles.narrow}>{initials(user.name)}</span>
      </button>
      {open && <MenuPanel user={user} />}
    </div>
  );
}

function MenuPanel({ user }: { user: SessionUser }) {
  const { choice, setChoice } = useTheme();
  const signOut = useSignOut();
  return (
    <div id="user-menu" className={styles.panel}>
      <div className={styles.identity}>
        <strong>{user.name}</strong>
        <div className="soft">{user.email}</div>
      </div>
      <fieldset className={styles.theme}>
        <legend>Appearance</legend>
        {CHOICES.map(([value, label]) => (
          <label key={value}>
            <input type="radio" name="appearance" checked={choice === value} onChange={() => setChoice(value)} />{' '}
            {label}
          </label>
        ))}
      </fieldset>
      <Link to="/about" className={styles.item}>
        About and cautions
      </Link>
      <button type="button" className={styles.item} disabled={signOut.isPending} onClick={() => signOut.mutate()}>
        Sign out
      </button>
      {signOut.isError && (
        <p role="alert" className={styles.failed}>
          Signing out failed. Try again.
        </p>
      )}
    </div>
  );
}
