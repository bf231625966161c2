import { App, Button, Input, Modal } from 'antd';

import type { PasswordLink } from '../../../api/types';
import { formatInstant } from '../../../lib/dates';
import styles from './people.module.css';

interface OneTimeLinkProps {
  name: string;
  link: PasswordLink | null;
  onClose: () => void;
}

/** Shown once: the server keeps only a hash of it. */
export function OneTimeLink({ name, link, onClose }: OneTimeLinkProps) {
  const { message } = App.useApp();
  const address = link ? `${window.location.origin}${link.path}` : '';
  const copy = async (): Promise<void> => {
    try {
      await navigator.clipboard.writeText(address);
      void message.success('Copied.');
    } catch {
      // Without https or permission the text can still be selected and copied by hand.
      void message.info('Select the link and copy it by hand.');
    }
  };
  return (
    <Modal
      open={link !== null}
      title={`One-time link for ${name}`}
      onCancel={onClose}
      mask={{ closable: false }}
      width={600}
      footer={[
        <Button key="copy" type="primary" onClick={() => void copy()}>
          Copy the link
        </Button>,
        <Button key="close" onClick={onClose}>
          Done
        </Button>,
      ]}
    >
      <p>Hand it over in person or by a way you trust. Whoever opens it chooses the password of this account.</p>
      <Input
        className={styles.link}
        value={address}
        readOnly
        aria-label="One-time link"
        onFocus={(event) => event.target.select()}
      />
      <p className="soft">
        It works once{link && `, until ${formatInstant(link.expiresAt)}`}, and is not shown again after this.
      </p>
    </Modal>
  );
}
