import { Modal } from 'antd';

import { useShortcutGroups, type ShortcutGroup } from './shortcuts';
import styles from './shortcuts-help.module.css';

const EVERYWHERE: ShortcutGroup = {
  title: 'Everywhere',
  shortcuts: [
    { keys: '?', does: 'This list' },
    { keys: 'Esc', does: 'Close the panel or dialog' },
    { keys: 'Tab', does: 'Next control; the first one on a page skips to its content' },
  ],
};

export function ShortcutsHelp({ open, onClose }: { open: boolean; onClose: () => void }) {
  const groups = [EVERYWHERE, ...useShortcutGroups()];
  return (
    <Modal open={open} onCancel={onClose} footer={null} title="Keyboard shortcuts" width={520}>
      {groups.map((group) => (
        <section key={group.title} className={styles.group}>
          <h3>{group.title}</h3>
          <dl className={styles.list}>
            {group.shortcuts.map(({ keys, does }) => (
              <div key={keys} className={styles.row}>
                <dt>
                  <kbd className={styles.keys}>{keys}</kbd>
                </dt>
                <dd>{does}</dd>
              </div>
            ))}
          </dl>
        </section>
      ))}
    </Modal>
  );
}
