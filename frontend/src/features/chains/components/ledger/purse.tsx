import type { StageReport, GbwCase, Verdict } from '../../../../api/types';
import { FigureText } from '../../../../components/figure-text';
import { formatFigure } from '../../../../lib/format-figure';
import { purseGeometry } from '../../lib/purse-geometry';
import { toneOf, verdictOf } from '../../lib/verdicts';
import { hatchOf } from './lane-defs';
import styles from './purse.module.css';

type OpenFigure = (figure: string, title: string) => void;

interface PurseProps {
  report: StageReport;
  gbwCase: GbwCase;
  onOpen: OpenFigure;
}

/** What the device has, what the stage spends of it, what is left. */
export function Purse({ report, gbwCase, onOpen }: PurseProps) {
  const { figures, gbwBasis } = report.cases[gbwCase];
  if (!report.hasGbw) return <NoPurse report={report} gbwCase={gbwCase} onOpen={onOpen} />;
  const verdict = verdictOf(report.checks, 'gbw') ?? 'unknown';
  const overspent = (figures.gbwLeft.value ?? 0) < 0;
  return (
    <div className={styles.purse}>
      <div className={styles.line} title={gbwBasis}>
        <span>
          has{' '}
          <FigureText figure={figures.gbwHave} name={`${report.label} GBW`} onOpen={() => onOpen('gbwHave', 'GBW')} />
        </span>
        <FigureText
          figure={figures.gbwLeft}
          name={`${report.label} GBW left`}
          tone={overspent ? 'over' : undefined}
          onOpen={() => onOpen('gbwLeft', 'GBW left')}
          className={styles.left}
        />
      </div>
      <PurseBar haveHz={figures.gbwHave.value} usedHz={figures.gbwUsed.value} verdict={verdict} />
      <div className={styles.line}>
        <span className={styles.soft}>
          uses{' '}
          <FigureText
            figure={figures.gbwUsed}
            name={`${report.label} GBW used`}
            onOpen={() => onOpen('gbwUsed', 'GBW used')}
          />
        </span>
        <FigureText
          figure={figures.headroom}
          name={`${report.label} headroom`}
          tone={verdict}
          strong
          onOpen={() => onOpen('headroom', 'Headroom')}
        />
      </div>
    </div>
  );
}

export function PurseBar({
  haveHz,
  usedHz,
  verdict,
}: {
  haveHz: number | null;
  usedHz: number | null;
  verdict: Verdict;
}) {
  const purse = purseGeometry(haveHz, usedHz);
  const whole = (fraction: number) => `${(fraction * 100).toFixed(2)}%`;
  if (!purse) return <div className={`${styles.bar} ${styles.empty}`} />;
  const over = purse.overspent > 0;
  return (
    <svg className={styles.bar} aria-hidden="true" focusable="false">
      <rect className={styles.has} width={whole(purse.has)} height="100%" />
      <rect className={over ? styles.overspent : styles.spent} width={whole(over ? 1 : purse.spent)} height="100%" />
      {over && <rect width="100%" height="100%" fill={hatchOf(verdict === 'clear' ? 'over' : verdict)} />}
      {over && <rect className={styles.purseEnd} x={whole(purse.has)} width="2" height="100%" />}
    </svg>
  );
}

function NoPurse({ report, gbwCase, onOpen }: PurseProps) {
  const { figures, gbwBasis } = report.cases[gbwCase];
  const { cornerUpper, bandwidthRatio } = figures;
  return (
    <div className={styles.purse}>
      <div className={styles.soft}>{gbwBasis}</div>
      {cornerUpper.value !== null && (
        <div>
          corner {formatFigure(cornerUpper).text}{' '}
          <FigureText
            figure={bandwidthRatio}
            name={`${report.label} bandwidth over the band's top edge`}
            tone={toneOf(report.checks, 'bandwidth')}
            onOpen={() => onOpen('bandwidthRatio', 'Bandwidth over band')}
          />{' '}
          the band
        </div>
      )}
    </div>
  );
}
