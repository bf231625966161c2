import Drawer from 'antd/es/drawer';

import { useWorkspace } from '../workspace-context';
import { SpecificationForm, specificationMessages } from './specification-form';

/** The specification is edited like the stages: figures follow, undo works, saving keeps it. */
export function SpecificationDrawer({ onClose }: { onClose: () => void }) {
  const { control, edits, preview, chain, editable } = useWorkspace();
  return (
    <Drawer open onClose={onClose} title="Specification" size={620} mask={false} destroyOnHidden>
      <p className="soft" style={{ marginBottom: 16 }}>
        It belongs to the chain: all {chain.options.length} options are held to it.
      </p>
      <div onBlur={control.settle}>
        <SpecificationForm
          specification={control.draft.specification}
          onChange={edits.specify}
          messages={specificationMessages(preview.messages)}
          currency={chain.currency}
          disabled={!editable}
        />
      </div>
    </Drawer>
  );
}
