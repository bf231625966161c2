import { Button } from 'antd';

import { ApiError } from '../api/api-error';
import styles from './error-notice.module.css';
import { VerdictIcon } from './verdict-mark';

interface ErrorNoticeProps {
  error: unknown;
  /** What failed, e.g. "The devices could not be loaded." */
  title?: string;
  onRetry?: () => void;
}

function describe(error: unknown): { message: string; requestId: string | null } {
  if (error instanceof ApiError) return { message: error.message, requestId: error.requestId };
  return { message: 'Something went wrong in this page.', requestId: null };
}

/** A failed request beside what is already on the screen; it never replaces what somebody is working on. */
export function ErrorNotice({ error, title, onRetry }: ErrorNoticeProps) {
  if (!error) return null;
  const { message, requestId } = describe(error);
  return (
    <div className={styles.notice} role="alert">
      <VerdictIcon verdict="over" size={18} />
      <div className={styles.body}>
        {title && <strong>{title} </strong>}
        {message}
        {requestId && <span className={styles.id}> Request {requestId}</span>}
      </div>
      {onRetry && (
        <Button size="small" onClick={onRetry}>
          Try again
        </Button>
      )}
    </div>
  );
}
