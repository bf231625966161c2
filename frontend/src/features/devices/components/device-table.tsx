import { Link } from 'react-router-dom';

import type { DeviceDto } from '../../../api/types';
import { GradeMark } from '../../../components/data-marks';
import { describeQuantity } from '../../../lib/quantity-units';
import { KIND_LABELS, LIFECYCLE_LABELS, type DeviceFilters, type DeviceSort } from '../lib/device-filters';
import { sheetOf } from '../lib/device-draft';
import { bandwidthOf, columnText, lowestPriceText } from '../lib/device-text';
import styles from './device-table.module.css';

interface DeviceTableProps {
  devices: readonly DeviceDto[];
  filters: DeviceFilters;
  onChange: (filters: DeviceFilters) => void;
  /** The rows are of the question before. */
  stale: boolean;
}

export function DeviceTable({ devices, filters, onChange, stale }: DeviceTableProps) {
  const sortBy = (sort: DeviceSort): void =>
    onChange({ ...filters, sort, order: filters.sort === sort && filters.order === 'asc' ? 'desc' : 'asc', page: 1 });
  const head = { filters, onSort: sortBy };
  return (
    <div className="table-scroll" aria-busy={stale}>
      <table className={`data-table ${styles.table} ${stale ? styles.stale : ''}`}>
        <caption className="visually-hidden">Devices</caption>
        <thead>
          <tr>
            <SortHead {...head} sort="partNumber" label="Part number" />
            <th scope="col">Kind</th>
            <SortHead {...head} sort="gbw" label="GBW min" number />
            <th scope="col" className="number">
              typ
            </th>
            <th scope="col" className="number">
              Stable from
            </th>
            <th scope="col" className="number">
              Slew
            </th>
            <th scope="col" className="number">
              Current
            </th>
            <SortHead {...head} sort="price" label="Lowest price" number />
            <th scope="col">State</th>
          </tr>
        </thead>
        <tbody>
          {devices.map((device) => (
            <DeviceTableRow key={device.id} device={device} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

interface SortHeadProps {
  sort: DeviceSort;
  label: string;
  number?: boolean;
  filters: DeviceFilters;
  onSort: (sort: DeviceSort) => void;
}

function SortHead({ sort, label, number, filters, onSort }: SortHeadProps) {
  const active = filters.sort === sort;
  const direction = filters.order === 'asc' ? 'ascending' : 'descending';
  return (
    <th scope="col" className={number ? 'number' : undefined} aria-sort={active ? direction : 'none'}>
      <button type="button" className={styles.sort} onClick={() => onSort(sort)}>
        {label}
        <svg
          width="8"
          height="8"
          viewBox="0 0 8 8"
          aria-hidden="true"
          className={active ? styles.arrow : styles.noArrow}
        >
          <path d={filters.order === 'asc' ? 'M4 1 7.5 7h-7z' : 'M4 7 .5 1h7z'} fill="currentColor" />
        </svg>
      </button>
    </th>
  );
}

function DeviceTableRow({ device }: { device: DeviceDto }) {
  return (
    <tr>
      <th scope="row">
        <Link to={`/devices/${device.id}`}>{device.partNumber}</Link> <GradeMark grade={device.grade} />
        {device.maker && <div className={styles.maker}>{device.maker}</div>}
      </th>
      <BandwidthCells device={device} />
      <td className="number">{stableFromText(device) ?? <Missing what="not given" />}</td>
      <td className="number">{sheetText(device, 'slewRateVPerS', 'V/µs')}</td>
      <td className="number">{sheetText(device, 'supplyCurrentA', 'mA')}</td>
      <td className="number">{lowestPriceText(device.quote) ?? <Missing what="no quote" />}</td>
      <td>
        <StateText device={device} />
      </td>
    </tr>
  );
}

/** Kind and bandwidth; the note says what stands there where a kind has no GBW. */
function BandwidthCells({ device }: { device: DeviceDto }) {
  const bandwidth = bandwidthOf(device);
  return (
    <>
      <td>
        {KIND_LABELS[device.kind]}
        {bandwidth && bandwidth.note !== '' && <div className="soft">{bandwidth.note}</div>}
      </td>
      <td className="number">{columnText(bandwidth?.sheet, 'min', 'MHz') || <Missing what="no minimum" />}</td>
      <td className="number">{columnText(bandwidth?.sheet, 'typ', 'MHz') || <Missing what="no typical value" />}</td>
    </>
  );
}

/** Smallest noise gain at which the maker calls it stable; null = not given. */
function stableFromText(device: DeviceDto): string | null {
  const least = device.kind === 'voltage-feedback' ? device.minimumStableGain : undefined;
  return least === undefined ? null : `×${least}`;
}

/** The worst column that is given: minimum of what should be large, else typical. */
function sheetText(device: DeviceDto, key: string, unit: 'V/µs' | 'mA') {
  const sheet = sheetOf(device, key);
  const value = unit === 'mA' ? (sheet?.max ?? sheet?.typ) : (sheet?.min ?? sheet?.typ);
  return value === undefined ? <Missing what="not given" /> : describeQuantity(value, unit);
}

function Missing({ what }: { what: string }) {
  return (
    <span className="soft" title={what}>
      –<span className="visually-hidden"> {what}</span>
    </span>
  );
}

function StateText({ device }: { device: DeviceDto }) {
  const lapsing = device.lifecycle && device.lifecycle !== 'active' ? LIFECYCLE_LABELS[device.lifecycle] : null;
  return (
    <>
      {device.verifiedBy ? 'verified' : <span className="soft">not verified</span>}
      {lapsing && <div className={styles.lapsing}>{lapsing}</div>}
    </>
  );
}
