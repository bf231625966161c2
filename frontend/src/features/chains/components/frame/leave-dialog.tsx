import Button from 'antd/es/button';
import Modal from 'antd/es/modal';
import { useEffect, useRef } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Blocker } from 'react-router-dom';

import type { SaveControl } from '../use-save';

/** Leaving with unsaved changes: they stay in this browser in any case. */
export function LeaveDialog({ blocker, save }: { blocker: Blocker; save: SaveControl }) {
  const navigate = useNavigate();
  const latest = useRef(blocker);
  useEffect(() => {
    latest.current = blocker;
  }, [blocker]);
  if (blocker.state !== 'blocked') return null;
  const { location } = blocker;
  // While it was being saved the question may have gone by itself: then nothing holds the way to where they were going.
  const saveAndLeave = async () => {
    const isSaved = await save.save();
    const now = latest.current;
    if (now.state === 'blocked') (isSaved ? now.proceed : now.reset)();
    else if (isSaved) await navigate(location);
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
