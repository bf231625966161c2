import { Drawer, Skeleton } from 'antd';

import type { GbwCase, Working, WorkingDatum } from '../api/types';
import { ErrorNotice } from './error-notice';
import styles from './working-drawer.module.css';

const CASE_NAMES: Readonly<Record<GbwCase, string>> = {
  typical: 'typical',
  minimum: 'minimum',
  minimumHot: 'minimum, hot',
};

interface WorkingDrawerProps {
  open: boolean;
  onClose: () => void;
  working: Working | null | undefined;
  /** Shown until the working has arrived. */
  title?: string;
  loading?: boolean;
  error?: unknown;
  onRetry?: () => void;
}

/** How a figure came about: formula, values put in, data with pages, assumptions, validity, source. */
export function WorkingDrawer({ open, onClose, working, title, loading, error, onRetry }: WorkingDrawerProps) {
  return (
    <Drawer open={open} onClose={onClose} title={working?.title ?? title ?? 'Working'} size={480} mask={false}>
      <ErrorNotice error={error} title="The working could not be computed." onRetry={onRetry} />
      {loading && !working && <Skeleton active paragraph={{ rows: 8 }} />}
      {working && <WorkingBody working={working} />}
    </Drawer>
  );
}

function WorkingBody({ working }: { working: Working }) {
  return (
    <div className={styles.body}>
      <p className={styles.result}>{working.result}</p>
      <p className="soft">GBW case: {CASE_NAMES[working.gbwCase]}</p>
      <h3>Steps</h3>
      <ol className={styles.steps}>
        {working.steps.map((step, index) => (
          <li key={index}>
            <div className={styles.formula}>{step.formula}</div>
            <div className={styles.formula}>{step.substituted}</div>
            <div className={styles.stepResult}>{step.result}</div>
          </li>
        ))}
      </ol>
      {working.data.length > 0 && <DataTable data={working.data} />}
      <TextList title="Assumptions" texts={working.assumptions} />
      <TextList title="Valid while" texts={working.validity} />
      <h3>Source</h3>
      <p>{working.source}</p>
    </div>
  );
}

function DataTable({ data }: { data: readonly WorkingDatum[] }) {
  return (
    <table className="data-table">
      <caption>Data used</caption>
      <thead>
        <tr>
          <th scope="col">Quantity</th>
          <th scope="col" className="number">
            Value
          </th>
          <th scope="col">From</th>
        </tr>
      </thead>
      <tbody>
        {data.map((datum, index) => (
          <tr key={index}>
            <th scope="row">{datum.label}</th>
            <td className="number">{datum.value}</td>
            <td>
              {datum.origin}
              {datum.page && `, p. ${datum.page}`}
              {datum.condition && <div className="soft">{datum.condition}</div>}
              {datum.assumed && <strong className={styles.assumed}> assumed</strong>}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function TextList({ title, texts }: { title: string; texts: readonly string[] }) {
  if (texts.length === 0) return null;
  return (
    <>
      <h3>{title}</h3>
      <ul className={styles.texts}>
        {texts.map((text) => (
          <li key={text}>{text}</li>
        ))}
      </ul>
    </>
  );
}
