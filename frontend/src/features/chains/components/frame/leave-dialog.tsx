import Button from 'antd/es/button';
import Modal from 'antd/es/modal';
import type { Blocker } from 'react-router-dom';

import type { SaveControl } from '../use-save';

/** Leaving with unsaved changes: they stay in this browser in any case. */
export function LeaveDialog({ blocker, save }: { blocker: Blocker; save: SaveControl }) {
  if (blocker.state !== 'blocked') return null;
  const saveAndLeave = async () => {
    if (await save.save()) blocker.proceed();
    else blocker.reset();
  };
  return (
    <Modal
      open
      title="Leave with unsaved changes?"
      onCancel={() => blocker.reset()}
      footer={
        <>
          <Button onClick={() => blocker.reset()}>Stay</Button>
          <Button onClick={() => blocker.proceed()}>Leave without saving</Button>
          <Button type="primary" loading={save.saving} onClick={() => void saveAndLeave()}>
            Save and leave
          </Button>
        </>
      }
    >
      <p>The others do not see your changes until they are saved. This browser keeps them until you are back.</p>
    </Modal>
  );
}
