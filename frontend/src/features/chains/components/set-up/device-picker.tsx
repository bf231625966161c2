import { useQuery } from '@tanstack/react-query';
import Skeleton from 'antd/es/skeleton';
import { useState } from 'react';
import { Link } from 'react-router-dom';

import { isApiError } from '../../../../api/api-error';
import type { CandidatesReport, Stage } from '../../../../api/types';
import { ErrorNotice } from '../../../../components/error-notice';
import { candidatesQuery } from '../../queries';
import { useWorkspace } from '../workspace-context';
import { DeviceTable } from './device-table';
import { NeedsList } from './needs-list';
import styles from './set-up.module.css';
import { StageFindings } from './stage-findings';

type DeviceStage = Exclude<Stage, { kind: 'rc-section' }>;

interface Tried {
  /** The last answer for this stage. */
  readonly data: CandidatesReport | null;
  readonly outdated: boolean;
  readonly error: unknown;
  readonly retry: () => void;
}

function useTriedDevices(stage: DeviceStage): Tried {
  const { preview } = useWorkspace();
  const { specification, policy, stages, currency, buildQuantity } = preview.request;
  // A stage that was added a moment ago is not in the question yet; refused input would be refused here as well.
  const askable = stages.some((each) => each.id === stage.id) && !isApiError(preview.error, 422);
  const query = useQuery({
    ...candidatesQuery({ specification, policy, stages, currency, buildQuantity, stageId: stage.id }),
    enabled: askable,
  });
  const [lastGood, setLastGood] = useState<CandidatesReport | null>(null);
  if (query.data && query.data !== lastGood) setLastGood(query.data);
  return {
    data: query.data ?? lastGood,
    outdated: preview.outdated || query.isPlaceholderData || query.isFetching,
    error: askable ? query.error : null,
    retry: () => void query.refetch(),
  };
}

/** What passes here, beside every device tried here. */
export function DevicePicker({ stage }: { stage: DeviceStage }) {
  const { preview } = useWorkspace();
  const tried = useTriedDevices(stage);
  const report = preview.report?.stages.find((each) => each.stageId === stage.id) ?? null;
  return (
    <>
      <section className={styles.column} aria-label="What passes here">
        <h3>What passes here</h3>
        {tried.data ? (
          <NeedsList needs={tried.data.needs} />
        ) : (
          <Skeleton active title={false} paragraph={{ rows: 4 }} />
        )}
        <h3 className={styles.findingsTitle}>This stage</h3>
        {report && <StageFindings report={report} />}
      </section>
      <section className={`${styles.column} ${styles.deviceColumn}`} aria-label="Devices tried in this place">
        <ErrorNotice error={tried.error} title="The devices could not be tried." onRetry={tried.retry} />
        <TriedDevices stage={stage} tried={tried} />
        <p className={styles.libraryLink}>
          <Link to="/devices">Device library</Link>
        </p>
      </section>
    </>
  );
}

function TriedDevices({ stage, tried }: { stage: DeviceStage; tried: Tried }) {
  const { edits } = useWorkspace();
  if (!tried.data) return tried.error ? null : <Skeleton active paragraph={{ rows: 5 }} />;
  return (
    <DeviceTable
      candidates={tried.data.candidates}
      outdated={tried.outdated}
      onChoose={(deviceId) => edits.update({ ...stage, deviceId }, 'device')}
    />
  );
}
