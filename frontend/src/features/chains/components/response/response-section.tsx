import { useQuery } from '@tanstack/react-query';
import Button from 'antd/es/button';
import Segmented from 'antd/es/segmented';
import { useState } from 'react';

import type { Band, CurveRequest, FrequencyAxis } from '../../../../api/types';
import { EmptyState } from '../../../../components/empty-state';
import { ErrorNotice } from '../../../../components/error-notice';
import { SkeletonRows } from '../../../../components/skeleton-rows';
import { calculationQuery } from '../../queries';
import { useWorkspace } from '../workspace-context';
import { ResponseChart } from './response-chart';
import { ResponseTable } from './response-table';
import styles from './response.module.css';
import { StageToggles } from './stage-toggles';

type Span = 'axis' | 'band';
const POINTS = 401;

function rangeOf(span: Span, axis: FrequencyAxis, band: Band): CurveRequest {
  if (span === 'axis') return { fromHz: axis.fromHz, toHz: axis.toHz, points: POINTS };
  return { fromHz: band.lowHz / 1.6, toHz: band.highHz * 1.6, points: POINTS };
}

/** Gain over frequency: the chain with its cases, chosen stages, and the window that is required. */
export function ResponseSection() {
  const { control, preview } = useWorkspace();
  if (control.draft.stages.length === 0) {
    return <EmptyState title="No response yet">Add a stage in the ledger; its response is drawn here.</EmptyState>;
  }
  return preview.report && <Response axis={preview.report.axis} />;
}

function Response({ axis }: { axis: FrequencyAxis }) {
  const { preview } = useWorkspace();
  const [span, setSpan] = useState<Span>('axis');
  const [asTable, setAsTable] = useState(false);
  const [shownStages, setShownStages] = useState<readonly string[]>([]);
  const range = rangeOf(span, axis, preview.request.specification.band);
  const query = useQuery(calculationQuery({ ...preview.request, include: { curves: range } }));
  const curves = query.data?.curves;
  return (
    <section aria-label="Response">
      <div className={styles.tools}>
        <StageToggles shown={shownStages} onChange={setShownStages} />
        <Segmented<Span>
          size="small"
          className={styles.segmented}
          aria-label="Frequency range"
          value={span}
          onChange={setSpan}
          options={[
            { value: 'axis', label: 'whole axis' },
            { value: 'band', label: 'around the band' },
          ]}
        />
        <Button size="small" aria-pressed={asTable} onClick={() => setAsTable(!asTable)}>
          {asTable ? 'Show as chart' : 'Show as table'}
        </Button>
      </div>
      <ErrorNotice
        error={query.error}
        title="The response could not be computed."
        onRetry={() => void query.refetch()}
      />
      {!curves && !query.error && <SkeletonRows />}
      {curves && (
        <div className={query.isPlaceholderData || preview.outdated ? styles.outdated : ''}>
          {asTable ? (
            <ResponseTable curves={curves} shownStages={shownStages} />
          ) : (
            <ResponseChart curves={curves} shownStages={shownStages} closeUp={span === 'band'} />
          )}
        </div>
      )}
    </section>
  );
}
