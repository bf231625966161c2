import type { DeviceKind, Grade, Lifecycle } from '../calculator/engine';

/** A device with its quote and the names of its people, as one SQL statement reads it. */
export interface DeviceRow {
  readonly id: string;
  readonly kind: DeviceKind;
  readonly partNumber: string;
  readonly maker: string;
  readonly grade: Grade;
  readonly package: string | null;
  readonly lifecycle: Lifecycle | null;
  readonly lifecycleDate: string | null;
  readonly channels: number;
  /** JSON text. */
  readonly parameters: string;
  readonly datasheetRevision: string | null;
  readonly datasheetTitle: string | null;
  readonly notes: string | null;
  readonly enteredById: string;
  readonly enteredByName: string;
  readonly valuesEditedById: string;
  readonly verifiedById: string | null;
  readonly verifiedByName: string | null;
  readonly version: number;
  readonly updatedAt: string;
  readonly quoteVersion: number | null;
  readonly quoteCurrency: string | null;
  readonly quoteReference: string | null;
  readonly quoteValidUntil: string | null;
  readonly quoteSupplier: string | null;
  /** JSON text: the price breaks in ascending order; null without a quote. */
  readonly quoteBreaks: string | null;
}

/** Quotes belong to a feature above this one; reading them along spares two further queries a request. */
export const SELECT_DEVICES = `
  SELECT d.id, d.kind, d.part_number AS partNumber, d.maker, d.grade, d.package, d.lifecycle,
    d.lifecycle_date AS lifecycleDate, d.channels, d.parameters,
    d.datasheet_revision AS datasheetRevision, d.datasheet_title AS datasheetTitle, d.notes,
    d.entered_by_id AS enteredById, entered.name AS enteredByName, d.values_edited_by_id AS valuesEditedById,
    d.verified_by_id AS verifiedById, verified.name AS verifiedByName, d.version, d.updated_at AS updatedAt,
    q.version AS quoteVersion, q.currency AS quoteCurrency, q.reference AS quoteReference,
    q.valid_until AS quoteValidUntil, q.supplier AS quoteSupplier,
    (SELECT json_group_array(json_object('quantity', b.quantity, 'unitPriceMicros', b.unit_price_micros))
      FROM (SELECT quantity, unit_price_micros FROM quote_breaks WHERE quote_id = q.id ORDER BY quantity) b
      WHERE q.id IS NOT NULL) AS quoteBreaks`;

export const FROM_DEVICES = `
  FROM devices d
  JOIN users entered ON entered.id = d.entered_by_id
  LEFT JOIN users verified ON verified.id = d.verified_by_id
  LEFT JOIN quotes q ON q.device_id = d.id`;

/** Lowest unit price of a device's quote, whatever the quantity. */
export const LOWEST_PRICE = '(SELECT MIN(unit_price_micros) FROM quote_breaks WHERE quote_id = q.id)';
