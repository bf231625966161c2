import { Link } from 'react-router-dom';

import type { Desk } from '../../../api/types';
import styles from './desk-counts.module.css';

const plural = (count: number, word: string): string => `${word}${count === 1 ? '' : 's'}`;

export function DeskCounts({ counts }: { counts: Desk['counts'] }) {
  return (
    <ul className={styles.counts} aria-label="What there is">
      <li>
        <Link to="/projects">
          <strong>{counts.projects}</strong> {plural(counts.projects, 'project')}
        </Link>
      </li>
      <li>
        <span>
          <strong>{counts.chains}</strong> {plural(counts.chains, 'chain')}
        </span>
      </li>
      <li>
        <Link to="/devices">
          <strong>{counts.devices}</strong> {plural(counts.devices, 'device')}
        </Link>
      </li>
    </ul>
  );
}
