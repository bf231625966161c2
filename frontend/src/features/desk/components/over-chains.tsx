import { Link } from 'react-router-dom';

import type { DeskChain } from '../../../api/types';
import { FigureText } from '../../../components/figure-text';
import { VerdictMark } from '../../../components/verdict-mark';
import styles from './over-chains.module.css';

const addressOf = ({ projectId, chainId, optionId }: DeskChain): string =>
  `/projects/${projectId}/chains/${chainId}?option=${optionId}`;

/** Chains over a limit, each with what breaks first; one click leads to the ledger. */
export function OverChains({ chains }: { chains: readonly DeskChain[] }) {
  return (
    <ul className={styles.list}>
      {chains.map((chain) => (
        <li key={chain.optionId} className={styles.item}>
          <div className={styles.head}>
            <VerdictMark verdict="over" />
            <Link to={addressOf(chain)} className={styles.name}>
              {chain.projectCode} · {chain.chainName}
            </Link>
            <span className="soft">{chain.optionName}</span>
            <span className={styles.headroom}>
              <span className="soft">worst headroom </span>
              <FigureText figure={chain.worstHeadroom} strong />
              {chain.stage && <span className="soft"> {chain.stage}</span>}
            </span>
          </div>
          <p className={styles.text}>
            <strong>{chain.lead}</strong> {chain.text}
          </p>
        </li>
      ))}
    </ul>
  );
}
