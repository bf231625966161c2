import { useQuery } from '@tanstack/react-query';

import { WorkingDrawer } from '../../../../components/working-drawer';
import { calculationQuery } from '../../queries';
import { useWorkspace } from '../workspace-context';

export interface OpenWorking {
  readonly stageId: string | null;
  readonly figure: string;
  readonly title: string;
}

/** The working of one figure, of the very draft that is on the screen. */
export function ChainWorking({ open, onClose }: { open: OpenWorking; onClose: () => void }) {
  return <WorkingOf key={`${open.stageId}.${open.figure}`} open={open} onClose={onClose} />;
}

function WorkingOf({ open, onClose }: { open: OpenWorking; onClose: () => void }) {
  const { preview, gbwCase } = useWorkspace();
  const { stageId, figure, title } = open;
  const query = useQuery(calculationQuery({ ...preview.request, include: { working: { stageId, figure, gbwCase } } }));
  const working = query.data?.working;
  return (
    <WorkingDrawer
      open
      onClose={onClose}
      title={title}
      // Without a retry in sight, an earlier answer about another figure would be a wrong one.
      working={query.isPlaceholderData && working?.gbwCase !== gbwCase ? null : working}
      loading={query.isFetching}
      error={query.error}
      onRetry={() => void query.refetch()}
    />
  );
}
