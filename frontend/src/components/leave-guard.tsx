import { Modal } from 'antd';
import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';

interface LeaveGuardProps {
  /** Something is typed that is not saved. */
  when: boolean;
  /** Addresses under this path keep the draft and are let through. */
  stayUnder?: string;
  text?: string;
}

interface AfterSaving {
  readonly afterSaving?: boolean;
}

/** `navigate(path, AFTER_SAVING)`: what was typed is saved, even if the screen does not know it yet. */
export const AFTER_SAVING: { readonly state: AfterSaving } = { state: { afterSaving: true } };

const DEFAULT_TEXT = 'What you typed on this page is not saved yet.';

/** Warns before unsaved work is left, by a link or by closing the page. */
export function LeaveGuard({ when, stayUnder, text = DEFAULT_TEXT }: LeaveGuardProps) {
  const blocker = useBlocker(({ currentLocation, nextLocation }) => {
    if (!when || currentLocation.pathname === nextLocation.pathname) return false;
    if ((nextLocation.state as AfterSaving | null)?.afterSaving) return false;
    return stayUnder === undefined || !nextLocation.pathname.startsWith(stayUnder);
  });

  useEffect(() => {
    if (!when) return undefined;
    const warn = (event: BeforeUnloadEvent): void => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [when]);

  return (
    <Modal
      open={blocker.state === 'blocked'}
      title="Leave without saving?"
      okText="Leave"
      cancelText="Stay"
      okButtonProps={{ danger: true }}
      onOk={() => blocker.proceed?.()}
      onCancel={() => blocker.reset?.()}
    >
      {text}
    </Modal>
  );
}
