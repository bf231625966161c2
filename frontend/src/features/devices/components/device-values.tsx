import type { DeviceDto } from '../../../api/types';
import { Section } from '../../../components/section';
import { describeQuantity } from '../../../lib/quantity-units';
import { ALL, type DeviceField, type DeviceFieldGroup } from '../lib/device-field';
import { FIELD_GROUPS } from '../lib/device-fields';
import { sheetOf, valueOf } from '../lib/device-draft';
import { columnText } from '../lib/device-text';
import styles from './device-values.module.css';

const isGiven = (device: DeviceDto, field: DeviceField): boolean => valueOf(device, field.key) !== undefined;

/** The values as the datasheet has them, and what is not known because it gives none. */
export function DeviceValues({ device }: { device: DeviceDto }) {
  const groups = FIELD_GROUPS[device.kind];
  const missing = groups.flatMap((group) => group.fields).filter((field) => !isGiven(device, field));
  return (
    <>
      <Section title="Values">
        <div className="table-scroll">
          <table className={`data-table ${styles.table}`}>
            <caption className="visually-hidden">Datasheet values of {device.partNumber}</caption>
            <thead>
              <tr>
                <th scope="col">Quantity</th>
                {ALL.map((column) => (
                  <th key={column} scope="col" className="number">
                    {column}
                  </th>
                ))}
                <th scope="col">Condition</th>
                <th scope="col">Page</th>
              </tr>
            </thead>
            {groups.map((group) => (
              <GroupBody key={group.title} device={device} group={group} />
            ))}
          </table>
        </div>
      </Section>
      {missing.length > 0 && (
        <Section title="Not given">
          <ul className={styles.missing}>
            {missing.map((field) => (
              <li key={field.key}>
                {field.label}: <span className="soft">{field.without}</span>
              </li>
            ))}
          </ul>
        </Section>
      )}
    </>
  );
}

function GroupBody({ device, group }: { device: DeviceDto; group: DeviceFieldGroup }) {
  const given = group.fields.filter((field) => isGiven(device, field));
  if (given.length === 0) return null;
  return (
    <tbody>
      <tr className={styles.group}>
        <th scope="rowgroup" colSpan={6}>
          {group.title}
        </th>
      </tr>
      {given.map((field) => (
        <ValueRow key={field.key} device={device} field={field} />
      ))}
    </tbody>
  );
}

function ValueRow({ device, field }: { device: DeviceDto; field: DeviceField }) {
  const sheet = sheetOf(device, field.key);
  const single = valueOf(device, field.key);
  const name = (
    <th scope="row" className={styles.name}>
      {field.label}
      {field.symbol && <span className="soft"> {field.symbol}</span>}
    </th>
  );
  if (!sheet) {
    return (
      <tr>
        {name}
        <td className={styles.single} colSpan={3}>
          {typeof single === 'number' ? describeQuantity(single, field.unit) : ''}
        </td>
        <td />
        <td />
      </tr>
    );
  }
  return (
    <tr>
      {name}
      {ALL.map((column) => (
        <td key={column} className="number">
          {columnText(sheet, column, field.unit)}
        </td>
      ))}
      <td>{sheet.condition}</td>
      <td>{sheet.page}</td>
    </tr>
  );
}
