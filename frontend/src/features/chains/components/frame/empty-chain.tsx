import Button from 'antd/es/button';

import { EmptyState } from '../../../../components/empty-state';
import { bandText } from '../../lib/frequency-text';
import { useWorkspace } from '../workspace-context';

/** Nothing to budget yet: the way to the first stage. */
export function EmptyChain({ onAdd }: { onAdd: () => void }) {
  const { control, editable, openSpecification } = useWorkspace();
  const { band } = control.draft.specification;
  return (
    <EmptyState
      title="This option has no stages yet"
      action={
        editable && (
          <>
            <Button type="primary" onClick={onAdd}>
              Add the first stage
            </Button>
            <Button onClick={openSpecification}>Open the specification</Button>
          </>
        )
      }
    >
      The band is {bandText(band)}. Add the stages in signal order; each gets its lane, its headroom and its cost as
      soon as it is there.
    </EmptyState>
  );
}
