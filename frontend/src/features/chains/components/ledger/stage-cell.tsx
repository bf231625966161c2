import type { ReactNode } from 'react';

import type { Stage, StageReport } from '../../../../api/types';
import { GradeMark } from '../../../../components/data-marks';
import { deviceIdOf, topologyText } from '../../lib/stage-defaults';
import { useWorkspace } from '../workspace-context';
import styles from './ledger.module.css';

interface StageCellProps {
  stage: Stage;
  index: number;
  report: StageReport | null;
  /** The handle to drag it by. */
  children: ReactNode;
}

/** Where the device's name comes from while there are no figures yet. */
function usePartNumber(stage: Stage, report: StageReport | null): string | null {
  const { option } = useWorkspace();
  const deviceId = deviceIdOf(stage);
  if (report && report.deviceId === deviceId) return report.partNumber;
  return option.devices.find((device) => device.id === deviceId)?.partNumber ?? null;
}

export function StageCell({ stage, index, report, children }: StageCellProps) {
  const partNumber = usePartNumber(stage, report);
  return (
    <th scope="row" className={styles.stage}>
      <div className={styles.stageCell}>
        {children}
        <div className={styles.stageText}>
          <div className={styles.stageName} title={stage.name}>
            S{index + 1} {stage.name}
          </div>
          <div className={styles.stageDevice}>
            {partNumber && <span title={partNumber}>{partNumber}</span>} <GradeMark grade={report?.grade ?? null} />
            {partNumber ? ' · ' : ''}
            {topologyText(stage)}
          </div>
        </div>
      </div>
    </th>
  );
}
