import { Button } from 'antd';

import { PAGE_SIZE } from '../lib/device-filters';
import styles from './pager.module.css';

interface PagerProps {
  page: number;
  total: number;
  onChange: (page: number) => void;
}

export function Pager({ page, total, onChange }: PagerProps) {
  const pages = Math.max(1, Math.ceil(total / PAGE_SIZE));
  const first = (page - 1) * PAGE_SIZE + 1;
  const last = Math.min(total, page * PAGE_SIZE);
  return (
    <nav className={styles.pager} aria-label="Pages of the list">
      <span className="soft">
        {total <= PAGE_SIZE ? `${total} device${total === 1 ? '' : 's'}` : `${first}–${last} of ${total} devices`}
      </span>
      {pages > 1 && (
        <>
          <Button size="small" disabled={page <= 1} onClick={() => onChange(page - 1)}>
            Previous
          </Button>
          <Button size="small" disabled={page >= pages} onClick={() => onChange(page + 1)}>
            Next
          </Button>
        </>
      )}
    </nav>
  );
}
