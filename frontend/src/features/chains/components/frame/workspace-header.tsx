import { useEffect } from 'react';

import { Breadcrumb } from '../../../../components/page-header';
import { bandText, frequencyText } from '../../lib/frequency-text';
import type { SaveControl } from '../use-save';
import { useWorkspace } from '../workspace-context';
import styles from './frame.module.css';
import { OptionBar } from './option-bar';
import { SaveBar } from './save-bar';

export function WorkspaceHeader({ save }: { save: SaveControl }) {
  const { chain, control, openSpecification } = useWorkspace();
  const { band } = control.draft.specification;
  useEffect(() => {
    document.title = `${chain.name}, ${control.draft.name} · Bandledger`;
  }, [chain.name, control.draft.name]);
  return (
    <header>
      <Breadcrumb
        trail={[
          { label: 'Projects', to: '/projects' },
          { label: `${chain.projectCode} ${chain.projectName}`, to: `/projects/${chain.projectId}` },
          { label: chain.name },
        ]}
      />
      <div className={styles.titleRow}>
        <h1>{chain.name}</h1>
        <OptionBar />
        <div className={styles.titleEnd}>
          <button
            type="button"
            className={styles.bandButton}
            onClick={openSpecification}
            title="Open the specification"
          >
            {bandText(band)}, at <strong>{frequencyText(band.operatingHz)}</strong>
          </button>
          <SaveBar save={save} />
        </div>
      </div>
    </header>
  );
}
