import { useEffect, type ReactNode } from 'react';
import { Link } from 'react-router-dom';

import styles from './page-header.module.css';

export interface Crumb {
  readonly label: string;
  readonly to?: string;
}

export function Breadcrumb({ trail }: { trail: readonly Crumb[] }) {
  return (
    <nav aria-label="Breadcrumb">
      <ol className={styles.trail}>
        {trail.map(({ label, to }) => (
          <li key={label}>{to ? <Link to={to}>{label}</Link> : <span>{label}</span>}</li>
        ))}
      </ol>
    </nav>
  );
}

interface PageHeaderProps {
  title: string;
  trail?: readonly Crumb[];
  /** Beside the title: options, marks. */
  beside?: ReactNode;
  /** At the right: actions. */
  extra?: ReactNode;
  /** Under the title, one line. */
  children?: ReactNode;
}

/** Breadcrumb, the page's one h1, actions; names the browser tab. */
export function PageHeader({ title, trail, beside, extra, children }: PageHeaderProps) {
  useEffect(() => {
    document.title = `${title} · Bandledger`;
  }, [title]);
  return (
    <header className={styles.header}>
      {trail && trail.length > 0 && <Breadcrumb trail={trail} />}
      <div className={styles.row}>
        <h1 className={styles.title}>{title}</h1>
        {beside}
        {extra && <div className={styles.extra}>{extra}</div>}
      </div>
      {children && <div className={styles.sub}>{children}</div>}
    </header>
  );
}
