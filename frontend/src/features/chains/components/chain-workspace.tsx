import { Suspense, useMemo, useState } from 'react';

import type { Chain, OptionDto } from '../../../api/types';
import { ErrorNotice } from '../../../components/error-notice';
import { useSessionUser } from '../../../components/session-context';
import { useShortcutHelp, type ShortcutGroup } from '../../../components/shortcuts';
import { SkeletonRows } from '../../../components/skeleton-rows';
import type { OpenWorking } from './frame/chain-working';
import styles from './frame/frame.module.css';
import { HeadlineFigures } from './frame/headline-figures';
import { KeptNotice } from './frame/kept-notice';
import { LedgerSection } from './frame/ledger-section';
import { PreviewProblem } from './frame/preview-problem';
import { SectionBar } from './frame/section-bar';
import { VerdictBanner } from './frame/verdict-banner';
import { WorkspaceHeader } from './frame/workspace-header';
import {
  ChainWorking,
  Conflict,
  LeaveDialog,
  ResponseSection,
  SetUpPanel,
  SpecificationDrawer,
  useWarmUp,
} from './lazy-parts';
import { useDraft } from './use-draft';
import { useLeaveGuard } from './use-leave-guard';
import { usePreview } from './use-preview';
import { useSave } from './use-save';
import { useShortcuts } from './use-shortcuts';
import { useStageEdits } from './use-stage-edits';
import { useWorkspaceAddress } from './use-workspace-address';
import { useWorkspace, WorkspaceContext, type Workspace } from './workspace-context';

const SHORTCUTS: ShortcutGroup = {
  title: 'Chain workspace',
  shortcuts: [
    { keys: '↑ ↓', does: 'Walk through the stages' },
    { keys: 'Enter', does: 'Open the set-up of the stage' },
    { keys: 'Esc', does: 'Close the set-up' },
    { keys: 'Alt + ↑ ↓', does: 'Move the stage' },
    { keys: 'Delete', does: 'Remove the stage' },
    { keys: 'Ctrl + S', does: 'Save' },
    { keys: 'Ctrl + Z', does: 'Undo' },
    { keys: 'Ctrl + Shift + Z', does: 'Redo' },
  ],
};

interface ChainWorkspaceProps {
  chain: Chain;
  option: OptionDto;
}

/** One option of a chain under work. Give it `key={option.id}`: another option is another draft. */
export function ChainWorkspace({ chain, option }: ChainWorkspaceProps) {
  const user = useSessionUser();
  const address = useWorkspaceAddress();
  const control = useDraft(user.id, chain, option);
  const edits = useStageEdits(control.draft, control.edit);
  const preview = usePreview(chain, control.draft);
  const save = useSave(chain.id, control);
  const blocker = useLeaveGuard(chain.id, option.id, control.dirty);
  const [working, setWorking] = useState<OpenWorking | null>(null);
  const [specifying, setSpecifying] = useState(false);
  const editable = chain.can.edit && option.can.edit;
  useShortcutHelp(SHORTCUTS);
  useShortcuts({ save: () => void save.save(), undo: control.undo, redo: control.redo });

  const openers = useMemo(
    () => ({
      openWorking: (stageId: string | null, figure: string, title: string) => setWorking({ stageId, figure, title }),
      openSpecification: () => setSpecifying(true),
    }),
    [],
  );
  const gbwCase = address.gbwCase ?? chain.policy.gbwCase;
  const workspace: Workspace = { chain, option, control, edits, preview, address, gbwCase, editable, ...openers };

  return (
    <WorkspaceContext value={workspace}>
      <div className={styles.workspace}>
        <WorkspaceHeader save={save} />
        <KeptNotice />
        <ErrorNotice error={save.error} title="The changes could not be saved." onRetry={() => void save.save()} />
        <WorkspaceBody />
        <Suspense fallback={null}>
          {address.section === 'ledger' && address.stageId !== null && <SetUpPanel />}
        </Suspense>
      </div>
      <Suspense fallback={null}>
        {working && <ChainWorking open={working} onClose={() => setWorking(null)} />}
        {specifying && <SpecificationDrawer onClose={() => setSpecifying(false)} />}
        {save.conflict && <Conflict save={save} />}
        {blocker.state === 'blocked' && <LeaveDialog blocker={blocker} save={save} />}
      </Suspense>
    </WorkspaceContext>
  );
}

function WorkspaceBody() {
  const { preview, address, control } = useWorkspace();
  const ready = preview.report !== null && control.draft.stages.length > 0;
  useWarmUp(ready);
  return (
    <div className={styles.body}>
      {ready && <VerdictBanner />}
      <PreviewProblem />
      {ready && <HeadlineFigures />}
      <SectionBar />
      {!preview.report && !preview.error && <SkeletonRows />}
      <Suspense fallback={<SkeletonRows />}>
        {address.section === 'ledger' ? <LedgerSection /> : <ResponseSection />}
      </Suspense>
    </div>
  );
}
