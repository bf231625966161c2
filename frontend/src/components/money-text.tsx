import type { Money } from '../api/types';
import { formatMicros, formatMoney } from '../lib/money';
import { classNames, FigureShell } from './figure-shell';
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
export function MoneyText({ money, name = 'Cost', hideCurrency, strong, onOpen }: MoneyTextProps) {
  const { amountMicros, currency, reason } = money;
  const full = formatMoney(money);
  const known = amountMicros !== null;
  return (
    <FigureShell
      className={classNames(styles.figure, strong && styles.strong, !known && styles.missing)}
      hint={reason}
      spoken={`${name} ${known ? full : (reason ?? 'not known')}`}
      onOpen={onOpen}
    >
      {known && hideCurrency ? formatMicros(amountMicros, currency) : full}
      {!known && <span className="visually-hidden"> not known: {reason}</span>}
    </FigureShell>
  );
}
