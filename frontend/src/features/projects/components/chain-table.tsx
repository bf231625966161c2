import { Link } from 'react-router-dom';

import type { ChainRow, OptionSummary } from '../../../api/types';
import { FigureText } from '../../../components/figure-text';
import { MoneyText } from '../../../components/money-text';
import { VerdictMark } from '../../../components/verdict-mark';
import styles from './chain-table.module.css';

/** Every option of every chain with verdict, worst headroom and cost, so that they can be compared at a glance. */
export function ChainTable({ projectId, chains }: { projectId: string; chains: readonly ChainRow[] }) {
  return (
    <div className="table-scroll">
      <table className={`data-table ${styles.table}`}>
        <caption className="visually-hidden">Chains and their options</caption>
        <thead>
          <tr>
            <th scope="col">Option</th>
            <th scope="col">Verdict</th>
            <th scope="col" className={styles.sentence}>
              What breaks first
            </th>
            <th scope="col" className="number">
              Worst headroom
            </th>
            <th scope="col" className={`number ${styles.secondary}`}>
              Gain
            </th>
            <th scope="col" className="number">
              Cost
            </th>
            <th scope="col" className={`number ${styles.secondary}`}>
              Limit
            </th>
          </tr>
        </thead>
        {chains.map((chain) => (
          <ChainBody key={chain.id} projectId={projectId} chain={chain} />
        ))}
      </table>
    </div>
  );
}

function ChainBody({ projectId, chain }: { projectId: string; chain: ChainRow }) {
  const address = `/projects/${projectId}/chains/${chain.id}`;
  return (
    <tbody>
      <tr className={styles.chain}>
        <th scope="rowgroup" colSpan={7}>
          <Link to={address} className={styles.name}>
            {chain.name}
          </Link>
          <span className={styles.specification}>{chain.specificationText}</span>
        </th>
      </tr>
      {chain.options.map((option) => (
        <tr key={option.id}>
          <th scope="row" className={styles.option}>
            <Link to={`${address}?option=${option.id}`}>{option.name}</Link>
          </th>
          <SummaryCells summary={option.summary} />
        </tr>
      ))}
    </tbody>
  );
}

function SummaryCells({ summary }: { summary: OptionSummary }) {
  const { verdict, lead, text, worstHeadroom, worstHeadroomStage, gain, cost, costLimit, reason } = summary;
  return (
    <>
      <td>
        <VerdictMark verdict={verdict} title={text} />
      </td>
      <td className={styles.sentence} title={text}>
        {reason ?? (lead === '' ? <span className="soft">nothing</span> : lead)}
      </td>
      <td className="number">
        <FigureText figure={worstHeadroom} />
        {worstHeadroomStage && <div className="soft">{worstHeadroomStage}</div>}
      </td>
      <td className={`number ${styles.secondary}`}>
        <FigureText figure={gain} />
      </td>
      <td className="number">
        <MoneyText money={cost} />
      </td>
      <td className={`number soft ${styles.secondary}`}>{costLimit ? <MoneyText money={costLimit} /> : 'none set'}</td>
    </>
  );
}
