import { useQuery } from '@tanstack/react-query';
import Skeleton from 'antd/es/skeleton';
import { Link } from 'react-router-dom';

import type { Stage } from '../../../../api/types';
import { ErrorNotice } from '../../../../components/error-notice';
import { candidatesQuery } from '../../queries';
import { useWorkspace } from '../workspace-context';
import { DeviceTable } from './device-table';
import { NeedsList } from './needs-list';
import styles from './set-up.module.css';
import { StageFindings } from './stage-findings';

type DeviceStage = Exclude<Stage, { kind: 'rc-section' }>;

/** What passes here, beside every device tried here. */
export function DevicePicker({ stage }: { stage: DeviceStage }) {
  const { preview, edits, chain } = useWorkspace();
  const { specification, policy, stages, currency, buildQuantity } = preview.request;
  // A stage that was added a moment ago is not in the question yet.
  const known = stages.some((each) => each.id === stage.id);
  const query = useQuery({
    ...candidatesQuery({ specification, policy, stages, currency, buildQuantity, stageId: stage.id }),
    enabled: known,
  });
  const report = preview.report?.stages.find((each) => each.stageId === stage.id) ?? null;
  const { data } = query;
  return (
    <>
      <section className={styles.column} aria-label="What passes here">
        <h3>What passes here</h3>
        {data ? <NeedsList needs={data.needs} /> : <Skeleton active title={false} paragraph={{ rows: 4 }} />}
        <h3 className={styles.findingsTitle}>This stage</h3>
        {report && <StageFindings report={report} />}
      </section>
      <section className={`${styles.column} ${styles.deviceColumn}`} aria-label={`Devices in ${chain.name}`}>
        <ErrorNotice error={query.error} title="The devices could not be tried." onRetry={() => void query.refetch()} />
        {data ? (
          <DeviceTable
            candidates={data.candidates}
            outdated={preview.outdated || query.isPlaceholderData || query.isFetching}
            onChoose={(deviceId) => edits.update({ ...stage, deviceId }, 'device')}
          />
        ) : (
          !query.error && <Skeleton active paragraph={{ rows: 5 }} />
        )}
        <p className={styles.libraryLink}>
          <Link to="/devices">Device library</Link>
        </p>
      </section>
    </>
  );
}
