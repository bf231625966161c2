import type { HeadlineItem } from '../../../../api/types';
import { FigureText } from '../../../../components/figure-text';
import { MoneyText } from '../../../../components/money-text';
import { VerdictIcon } from '../../../../components/verdict-mark';
import { useReport, useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

export function HeadlineFigures() {
  const { gbwCase, preview } = useWorkspace();
  const report = useReport();
  return (
    <dl className={`${styles.headline} ${preview.outdated ? styles.outdated : ''}`} aria-label="Headline figures">
      {report.headline[gbwCase].map((item) => (
        <HeadlineFigure key={item.key} item={item} />
      ))}
    </dl>
  );
}

function HeadlineFigure({ item }: { item: HeadlineItem }) {
  const { label, verdict, requirement } = item;
  return (
    <div className={styles.headlineItem}>
      <dt className={item.money ? styles.money : undefined}>{label}</dt>
      <dd className={styles.headlineValue}>
        <HeadlineValue item={item} />
      </dd>
      <dd className={`${styles.headlineLimit} ${verdict ? styles[verdict] : ''}`}>
        {verdict && <VerdictIcon verdict={verdict} size={12} />}
        <span>
          {verdict && <span className="visually-hidden">{verdict}: </span>}
          {requirement}
        </span>
      </dd>
    </div>
  );
}

/** A figure that is clear stays in ink; what is not stands out. */
function HeadlineValue({ item }: { item: HeadlineItem }) {
  const { openWorking } = useWorkspace();
  const { label, figure, money, verdict, chainFigure } = item;
  const tone = verdict === null || verdict === 'clear' ? undefined : verdict;
  if (money) {
    return (
      <span className={tone && styles[tone]}>
        <MoneyText money={money} name={label} onOpen={() => openWorking(null, 'cost', label)} />
      </span>
    );
  }
  if (!figure) return <span className="soft">–</span>;
  const open = chainFigure === null ? undefined : () => openWorking(null, chainFigure, label);
  return <FigureText figure={figure} name={label} tone={tone} onOpen={open} />;
}
