import { Button } from 'antd';
import { useEffect, useState } from 'react';

import type { DeviceKind, Grade, Lifecycle } from '../../../api/types';
import { QuantityInput } from '../../../components/quantity-input';
import { SelectField } from '../../../components/select-field';
import { TextField } from '../../../components/text-field';
import { MICROS_PER_UNIT } from '../../../lib/money';
import {
  GRADE_LABELS,
  isNarrowed,
  KIND_LABELS,
  LIFECYCLE_LABELS,
  NO_FILTERS,
  type DeviceFilters,
} from '../lib/device-filters';
import styles from './device-filter-bar.module.css';

const SEARCH_DELAY_MS = 250;

interface DeviceFilterBarProps {
  filters: DeviceFilters;
  onChange: (filters: DeviceFilters) => void;
}

const optionsOf = <T extends string>(labels: Readonly<Record<T, string>>): { value: T; label: string }[] =>
  (Object.keys(labels) as T[]).map((value) => ({ value, label: labels[value] }));

const VERIFIED = [
  { value: 'true', label: 'Verified' },
  { value: 'false', label: 'Not verified' },
] as const;

export function DeviceFilterBar({ filters, onChange }: DeviceFilterBarProps) {
  const change = (part: Partial<DeviceFilters>): void => onChange({ ...filters, ...part, page: 1 });
  return (
    <search className={styles.bar} aria-label="Filters">
      <SearchField search={filters.search} onChange={(search) => change({ search })} />
      <SelectField<DeviceKind>
        label="Kind"
        value={filters.kind}
        emptyLabel="All kinds"
        options={optionsOf(KIND_LABELS)}
        onEmpty={() => change({ kind: '' })}
        onChange={(kind) => change({ kind })}
      />
      <SelectField<Grade>
        label="Grade"
        value={filters.grade}
        emptyLabel="All grades"
        options={optionsOf(GRADE_LABELS)}
        onEmpty={() => change({ grade: '' })}
        onChange={(grade) => change({ grade })}
      />
      <QuantityInput
        label="GBW at least"
        unit="MHz"
        minimum={1}
        maximum={1e13}
        value={filters.minimumGbwHz}
        onChange={(minimumGbwHz) => change({ minimumGbwHz })}
      />
      <PriceLimit
        micros={filters.maximumPriceMicros}
        onChange={(maximumPriceMicros) => change({ maximumPriceMicros })}
      />
      <SelectField<Lifecycle>
        label="Lifecycle"
        value={filters.lifecycle}
        emptyLabel="All"
        options={optionsOf(LIFECYCLE_LABELS)}
        onEmpty={() => change({ lifecycle: '' })}
        onChange={(lifecycle) => change({ lifecycle })}
      />
      <SelectField<'true' | 'false'>
        label="Compared with datasheet"
        value={filters.verified}
        emptyLabel="All"
        options={VERIFIED}
        onEmpty={() => change({ verified: '' })}
        onChange={(verified) => change({ verified })}
      />
      {isNarrowed(filters) && (
        <Button
          className={styles.clear}
          onClick={() => onChange({ ...NO_FILTERS, sort: filters.sort, order: filters.order })}
        >
          Clear filters
        </Button>
      )}
    </search>
  );
}

/** Types freely; the address and the list follow a moment later. */
function SearchField({ search, onChange }: { search: string; onChange: (search: string) => void }) {
  const [typed, setTyped] = useState({ text: search, for: search });
  const text = typed.for === search ? typed.text : search;
  useEffect(() => {
    if (text === search) return undefined;
    const timer = setTimeout(() => onChange(text), SEARCH_DELAY_MS);
    return () => clearTimeout(timer);
    // `onChange` is new with every render of the page; only what is typed starts the clock.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [text, search]);
  return (
    <TextField
      label="Part number or maker"
      type="search"
      value={text}
      maxLength={120}
      onChange={(next) => setTyped({ text: next, for: search })}
    />
  );
}

interface PriceLimitProps {
  micros: number | null;
  onChange: (micros: number | null) => void;
}

function PriceLimit({ micros, onChange }: PriceLimitProps) {
  return (
    <QuantityInput
      label="Price at most"
      unit="number"
      suffix="each"
      minimum={0.000001}
      maximum={1e6}
      value={micros === null ? null : micros / MICROS_PER_UNIT}
      onChange={(value) => onChange(value === null ? null : Math.round(value * MICROS_PER_UNIT))}
    />
  );
}
