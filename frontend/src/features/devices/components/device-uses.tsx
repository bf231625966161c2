import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';

import type { DeviceUse, DeviceUses } from '../../../api/types';
import { ErrorNotice } from '../../../components/error-notice';
import { Section } from '../../../components/section';
import { SkeletonRows } from '../../../components/skeleton-rows';
import { deviceUsesQuery } from '../queries';

export function DeviceUsesSection({ deviceId }: { deviceId: string }) {
  const { data: uses, error, refetch } = useQuery(deviceUsesQuery(deviceId));
  return (
    <Section title="Where used">
      <ErrorNotice error={error} title="Its uses could not be loaded." onRetry={() => void refetch()} />
      {!uses && !error && <SkeletonRows rows={2} />}
      {uses && <UseList uses={uses} />}
    </Section>
  );
}

const addressOf = (use: DeviceUse): string => `/projects/${use.projectId}/chains/${use.chainId}?option=${use.optionId}`;

export function UseList({ uses }: { uses: DeviceUses }) {
  const { where, hiddenCount } = uses;
  if (where.length === 0 && hiddenCount === 0) {
    return <p className="soft">In no chain yet. It can be chosen in the set-up panel of any stage of its kind.</p>;
  }
  return (
    <>
      <ul style={{ margin: 0, paddingLeft: 18 }}>
        {where.map((use) => (
          <li key={`${use.optionId} ${use.stage}`}>
            <Link to={addressOf(use)}>
              {use.project}, {use.chain}, {use.option}
            </Link>
            : {use.stage}
          </li>
        ))}
      </ul>
      {hiddenCount > 0 && (
        <p className="soft">
          {where.length > 0 ? 'And in' : 'In'} {hiddenCount} stage{hiddenCount === 1 ? '' : 's'} of projects that you
          cannot see.
        </p>
      )}
    </>
  );
}
