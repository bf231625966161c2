import Modal from 'antd/es/modal';
import type { ReactNode } from 'react';

import { ErrorNotice } from '../../../../components/error-notice';

interface ConfirmDialogProps {
  title: string;
  okText: string;
  busy?: boolean;
  error?: unknown;
  onConfirm: () => Promise<void>;
  onClose: () => void;
  children: ReactNode;
}

export function ConfirmDialog({ title, okText, busy, error, onConfirm, onClose, children }: ConfirmDialogProps) {
  return (
    <Modal
      open
      title={title}
      okText={okText}
      okButtonProps={{ danger: true }}
      confirmLoading={busy}
      // A refusal shows up in `error`.
      onOk={() => void onConfirm().catch(() => undefined)}
      onCancel={onClose}
    >
      <p>{children}</p>
      <ErrorNotice error={error} />
    </Modal>
  );
}
