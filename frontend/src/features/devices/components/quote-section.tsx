import { App, Button } from 'antd';
import { useState } from 'react';

import { isApiError } from '../../../api/api-error';
import type { DeviceDto, Quote } from '../../../api/types';
import { EmptyState } from '../../../components/empty-state';
import { Section } from '../../../components/section';
import { formatPlainDate, today } from '../../../lib/dates';
import { formatMicros } from '../../../lib/money';
import { useRemoveQuote } from '../mutations';
import { QuoteForm } from './quote-form';
import styles from './quote-section.module.css';

/** The quote by hand: from it the cost column takes the unit price at the project's build quantity. */
export function QuoteSection({ device }: { device: DeviceDto }) {
  const [editing, setEditing] = useState(false);
  const { quote, can } = device;
  const edit = can.editQuote ? (
    <Button size="small" onClick={() => setEditing(true)}>
      {quote ? 'Edit the quote' : 'Enter a quote'}
    </Button>
  ) : null;
  return (
    <Section title="Quote" extra={quote && !editing ? edit : null}>
      {editing && <QuoteForm device={device} onClose={() => setEditing(false)} />}
      {!editing && quote && <QuoteTable device={device} quote={quote} />}
      {!editing && !quote && (
        <EmptyState title="No quote" action={edit}>
          Without a price the cost of every chain with this device is unknown.
        </EmptyState>
      )}
    </Section>
  );
}

function QuoteTable({ device, quote }: { device: DeviceDto; quote: Quote }) {
  const lapsed = quote.validUntil !== undefined && quote.validUntil < today();
  const details = [
    quote.supplier,
    quote.reference,
    quote.validUntil && `valid until ${formatPlainDate(quote.validUntil)}`,
  ].filter(Boolean);
  return (
    <div className={styles.quote}>
      <table className={`data-table ${styles.breaks}`}>
        <caption>Price of one piece, by quantity</caption>
        <thead>
          <tr>
            <th scope="col" className="number">
              From pieces
            </th>
            <th scope="col" className="number">
              {quote.currency} each
            </th>
          </tr>
        </thead>
        <tbody>
          {quote.breaks.map((step) => (
            <tr key={step.quantity}>
              <td className="number">{step.quantity}</td>
              <td className="number">{formatMicros(step.unitPriceMicros, quote.currency)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <div>
        {details.length > 0 && <p>{details.join(' · ')}</p>}
        {lapsed && <p className={styles.lapsed}>This quote has lapsed; its prices still count and are marked.</p>}
        <p className="soft">The cost column takes the price of the highest break that a build reaches.</p>
        {device.can.editQuote && <RemoveQuote device={device} />}
      </div>
    </div>
  );
}

function RemoveQuote({ device }: { device: DeviceDto }) {
  const { modal, message } = App.useApp();
  const remove = useRemoveQuote(device.id);
  const ask = (): void =>
    void modal.confirm({
      title: 'Remove this quote?',
      content: `The cost of every chain with ${device.partNumber} becomes unknown.`,
      okText: 'Remove',
      okButtonProps: { danger: true },
      onOk: () =>
        remove.mutate(device.quoteVersion, {
          onError: (error) => void message.error(isApiError(error) ? error.message : 'It did not work. Try again.'),
        }),
    });
  return (
    <Button size="small" type="text" loading={remove.isPending} onClick={ask} className={styles.remove}>
      Remove the quote
    </Button>
  );
}
