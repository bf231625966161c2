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
  const { openWorking } = useWorkspace();
  const { label, figure, money, verdict, requirement, chainFigure } = item;
  const tone = verdict === null || verdict === 'clear' ? undefined : verdict;
  const figureKey = money ? 'cost' : chainFigure;
  const open = figureKey === null ? undefined : () => openWorking(null, figureKey, label);
  return (
    <div className={styles.headlineItem}>
      <dt>{item.key === 'cost' ? <span className={styles.money}>{label}</span> : label}</dt>
      <dd className={`${styles.headlineValue} ${tone ? styles[tone] : ''}`}>
        {figure && <FigureText figure={figure} name={label} tone={tone} onOpen={open} />}
        {money && <MoneyText money={money} name={label} onOpen={open} />}
        {!figure && !money && <span className="soft">–</span>}
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
