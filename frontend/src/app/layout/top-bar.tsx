import { useState } from 'react';
import { Link, NavLink, useLocation } from 'react-router-dom';

import { LogoMark } from '../../components/logo';
import { useHasRole } from '../../components/session-context';
import styles from './top-bar.module.css';
import { UserMenu } from './user-menu';

interface Destination {
  readonly to: string;
  readonly label: string;
  readonly end?: boolean;
}

const EVERYBODY: readonly Destination[] = [
  { to: '/', label: 'Desk', end: true },
  { to: '/projects', label: 'Projects' },
  { to: '/devices', label: 'Devices' },
];

export function TopBar({ onHelp }: { onHelp: () => void }) {
  const administrates = useHasRole('admin');
  const { pathname } = useLocation();
  // Open for the address on which it was opened: going somewhere closes it.
  const [openAt, setOpenAt] = useState<string | null>(null);
  const open = openAt === pathname;
  const destinations = administrates ? [...EVERYBODY, { to: '/administration', label: 'Administration' }] : EVERYBODY;
  return (
    <header className={styles.bar}>
      <button
        type="button"
        className={styles.burger}
        aria-expanded={open}
        aria-controls="main-navigation"
        aria-label="Menu"
        onClick={() => setOpenAt(open ? null : pathname)}
      >
        <svg width="16" height="16" viewBox="0 0 16 16" stroke="currentColor" strokeWidth="1.8" aria-hidden="true">
          <path d="M2 4h12M2 8h12M2 12h12" />
        </svg>
      </button>
      <Link to="/" className={styles.brand} aria-label="Bandledger, to the desk">
        <LogoMark />
        <span>Bandledger</span>
      </Link>
      <nav id="main-navigation" aria-label="Main" className={`${styles.nav} ${open ? styles.navOpen : ''}`}>
        {destinations.map(({ to, label, end }) => (
          <NavLink
            key={to}
            to={to}
            end={end}
            className={({ isActive }) => `${styles.link} ${isActive ? styles.active : ''}`}
          >
            {label}
          </NavLink>
        ))}
      </nav>
      <div className={styles.right}>
        <button
          type="button"
          className={styles.help}
          onClick={onHelp}
          aria-label="Keyboard shortcuts"
          title="Keyboard shortcuts (?)"
        >
          ?
        </button>
        <UserMenu />
      </div>
    </header>
  );
}
