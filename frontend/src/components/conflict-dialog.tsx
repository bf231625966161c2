import { Button, Modal } from 'antd';

interface ConflictDialogProps {
  open: boolean;
  /** "This project", "The option Baseline". */
  what: string;
  /** Saves what is on the screen over the newer row. */
  onKeepMine: () => void;
  /** Drops what is on the screen and shows the newer row. */
  onTakeTheirs: () => void;
  onClose: () => void;
  saving?: boolean;
  children?: React.ReactNode;
}

/** A save that came too late: somebody else saved in between, and the person chooses. */
export function ConflictDialog(props: ConflictDialogProps) {
  const { open, what, onKeepMine, onTakeTheirs, onClose, saving, children } = props;
  return (
    <Modal
      open={open}
      title={`${what} was changed meanwhile`}
      onCancel={onClose}
      footer={[
        <Button key="close" onClick={onClose}>
          Keep editing
        </Button>,
        <Button key="theirs" onClick={onTakeTheirs}>
          Show theirs, drop mine
        </Button>,
        <Button key="mine" type="primary" loading={saving} onClick={onKeepMine}>
          Save mine over it
        </Button>,
      ]}
    >
      <p>Somebody else saved since you opened it. Nothing of yours is lost until you choose.</p>
      {children}
    </Modal>
  );
}
