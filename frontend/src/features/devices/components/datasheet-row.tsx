import { Input } from 'antd';
import { memo, useId } from 'react';

import { QuantityInput } from '../../../components/quantity-input';

import { EMPTY_SHEET, type SheetDraft } from '../lib/device-draft';
import { ALL, type Column, type DeviceField } from '../lib/device-field';
import styles from './device-form.module.css';

type Problems = Readonly<Record<string, string>>;

interface SheetRowProps {
  field: DeviceField;
  sheet: SheetDraft | undefined;
  problems: Problems;
  /** Must stay the same function: rows that nobody types in are not drawn again. */
  onChange: (key: string, sheet: SheetDraft) => void;
}

const COLUMN_NAMES: Readonly<Record<Column, string>> = { min: 'minimum', typ: 'typical', max: 'maximum' };

const labelOf = (field: DeviceField): string => (field.symbol ? `${field.label} (${field.symbol})` : field.label);

/** A row as datasheets have it: quantity, min, typ, max, condition, page. */
export const SheetRow = memo(function SheetRow({ field, sheet = EMPTY_SHEET, problems, onChange }: SheetRowProps) {
  const change = (part: Partial<SheetDraft>): void => onChange(field.key, { ...sheet, ...part });
  const offered = ALL.filter((column) => field.columns.includes(column) || sheet[column] !== null);
  const filled = ALL.some((column) => sheet[column] !== null);
  return (
    <div className={styles.row} role="group" aria-label={labelOf(field)}>
      <RowLabel field={field} filled={filled} error={problems[field.key]} />
      {ALL.map((column) => (
        <div key={column} className={`${styles.cell} ${offered.includes(column) ? '' : styles.notOffered}`}>
          {offered.includes(column) && (
            <QuantityInput
              bare
              label={`${field.label}, ${COLUMN_NAMES[column]}`}
              unit={field.unit}
              minimum={field.minimum}
              maximum={field.maximum}
              placeholder={column}
              value={sheet[column]}
              error={problems[`${field.key}.${column}`]}
              onChange={(value) => change({ [column]: value })}
            />
          )}
        </div>
      ))}
      <TextCell
        label={`${field.label}, condition`}
        className={styles.condition}
        placeholder="condition"
        maxLength={120}
        value={sheet.condition}
        error={problems[`${field.key}.condition`]}
        onChange={(condition) => change({ condition })}
      />
      <TextCell
        label={`${field.label}, datasheet page`}
        className={styles.cell}
        placeholder="page"
        maxLength={24}
        value={sheet.page}
        error={problems[`${field.key}.page`]}
        onChange={(page) => change({ page })}
      />
    </div>
  );
});

interface NumberRowProps {
  field: DeviceField;
  value: number | null;
  problems: Problems;
  onChange: (key: string, value: number | null) => void;
}

/** A row with one number, without columns. */
export const NumberRow = memo(function NumberRow({ field, value, problems, onChange }: NumberRowProps) {
  return (
    <div className={styles.row}>
      <RowLabel field={field} filled={value !== null} />
      <div className={styles.single}>
        <QuantityInput
          bare
          label={field.label}
          unit={field.unit}
          minimum={field.minimum}
          maximum={field.maximum}
          placeholder={field.placeholder}
          value={value}
          error={problems[field.key]}
          onChange={(next) => onChange(field.key, next)}
        />
      </div>
    </div>
  );
});

function RowLabel({ field, filled, error }: { field: DeviceField; filled: boolean; error?: string }) {
  return (
    <div className={styles.label}>
      {field.label}
      {field.symbol && <span className="soft"> {field.symbol}</span>}
      {field.required && <span className={styles.required}> required</span>}
      {!filled && field.without !== '' && <div className={styles.without}>{field.without}</div>}
      {error && (
        <div className={styles.error} role="alert">
          {error}
        </div>
      )}
    </div>
  );
}

interface TextCellProps {
  label: string;
  className?: string;
  placeholder: string;
  maxLength: number;
  value: string;
  error?: string;
  onChange: (value: string) => void;
}

function TextCell({ label, className, placeholder, maxLength, value, error, onChange }: TextCellProps) {
  const id = useId();
  return (
    <div className={className}>
      <Input
        value={value}
        placeholder={placeholder}
        maxLength={maxLength}
        aria-label={label}
        aria-invalid={error ? true : undefined}
        aria-describedby={error ? id : undefined}
        status={error ? 'error' : undefined}
        autoComplete="off"
        onChange={(event) => onChange(event.target.value)}
      />
      {error && (
        <div id={id} className={styles.error} role="alert">
          {error}
        </div>
      )}
    </div>
  );
}
