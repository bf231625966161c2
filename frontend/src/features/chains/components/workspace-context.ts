import { createContext, useContext } from 'react';

import type { Chain, ChainReport, GbwCase, OptionDto } from '../../../api/types';
import type { DraftControl } from './use-draft';
import type { Preview } from './use-preview';
import type { StageEdits } from './use-stage-edits';
import type { WorkspaceAddressControl } from './use-workspace-address';

/** What every part of the workspace works with. */
export interface Workspace {
  readonly chain: Chain;
  readonly option: OptionDto;
  readonly control: DraftControl;
  readonly edits: StageEdits;
  readonly preview: Preview;
  readonly address: WorkspaceAddressControl;
  /** The case on the screen: of the address, else the project's. */
  readonly gbwCase: GbwCase;
  readonly editable: boolean;
  /** Opens the working of a stage's figure, or of the chain's when the stage is null. */
  readonly openWorking: (stageId: string | null, figure: string, title: string) => void;
  readonly openSpecification: () => void;
}

export const WorkspaceContext = createContext<Workspace | null>(null);

export function useWorkspace(): Workspace {
  const workspace = useContext(WorkspaceContext);
  if (!workspace) throw new Error('useWorkspace needs a chain workspace above it');
  return workspace;
}

/** For parts that are drawn only once there are figures. */
export function useReport(): ChainReport {
  const { report } = useWorkspace().preview;
  if (!report) throw new Error('useReport needs figures');
  return report;
}
