import type { Money } from '../api/types';
import { formatMicros } from '../lib/money';
import styles from './figure-text.module.css';

export interface MoneyTextProps {
  money: Money;
  name?: string;
  /** The currency stands in the column's head. */
  hideCurrency?: boolean;
  strong?: boolean;
  onOpen?: () => void;
}

/** An amount, exact; a dash with its reason when it is not known (never a zero). */
export function MoneyText({ money, name, hideCurrency, strong, onOpen }: MoneyTextProps) {
  const known = money.amountMicros !== null;
  const amount = money.amountMicros === null ? '–' : formatMicros(money.amountMicros, money.currency);
  const text = known && !hideCurrency ? `${amount}\u00a0${money.currency}` : amount;
  const classes = `${styles.figure} ${strong ? styles.strong : ''} ${known ? '' : styles.missing}`;
  const content = (
    <>
      {text}
      {!known && <span className="visually-hidden"> not known: {money.reason}</span>}
    </>
  );
  if (!onOpen) {
    return (
      <span className={classes} title={money.reason}>
        {content}
      </span>
    );
  }
  return (
    <button
      type="button"
      className={`${classes} ${styles.button}`}
      title={money.reason ?? 'Show the working'}
      aria-label={`${name ?? 'Cost'} ${known ? `${amount} ${money.currency}` : (money.reason ?? 'not known')}, show the working`}
      onClick={(event) => {
        event.stopPropagation();
        onOpen();
      }}
    >
      {content}
    </button>
  );
}
