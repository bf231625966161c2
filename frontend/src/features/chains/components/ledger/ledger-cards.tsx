import type { Stage, StageReport } from '../../../../api/types';
import { FigureText } from '../../../../components/figure-text';
import { MoneyText } from '../../../../components/money-text';
import { VerdictMark } from '../../../../components/verdict-mark';
import { chainLaneVerdict, laneVerdict, verdictOf } from '../../lib/verdicts';
import { useReport, useWorkspace } from '../workspace-context';
import { AxisLabels } from './axis-labels';
import { LaneDefs } from './lane-defs';
import { LaneDrawing } from './lane-drawing';
import styles from './ledger.module.css';

/** The ledger on a narrow screen: the lane in full width, three figures under it; a tap opens the rest. */
export function LedgerCards() {
  const { control } = useWorkspace();
  const report = useReport();
  return (
    <>
      <LaneDefs />
      <div className={styles.axisRow} aria-hidden="true">
        <AxisLabels axis={report.axis} band={control.draft.specification.band} />
      </div>
      <ol className={styles.cards} aria-label="Ledger">
        {control.draft.stages.map((stage, index) => (
          <li key={stage.id}>
            <StageCard
              stage={stage}
              index={index}
              report={report.stages.find((each) => each.stageId === stage.id) ?? null}
            />
          </li>
        ))}
        <li>
          <ChainCard />
        </li>
      </ol>
    </>
  );
}

function StageCard({ stage, index, report }: { stage: Stage; index: number; report: StageReport | null }) {
  const { address } = useWorkspace();
  const over = report?.verdict.verdict === 'over';
  const selected = address.stageId === stage.id;
  return (
    <button
      type="button"
      className={`${styles.card} ${over ? styles.cardOver : ''} ${selected ? styles.cardSelected : ''}`}
      aria-current={selected ? 'true' : undefined}
      onClick={() => address.change({ stageId: stage.id })}
    >
      <span className={styles.cardHead}>
        <strong>
          S{index + 1} {stage.name}
        </strong>
        <span className="soft">{report?.partNumber}</span>
        {report && (
          <span className={styles.cardVerdict}>
            <VerdictMark verdict={report.verdict.verdict} />
          </span>
        )}
      </span>
      {report ? <CardFigures report={report} /> : <span className="soft">figures follow</span>}
    </button>
  );
}

function CardFigures({ report }: { report: StageReport }) {
  const { gbwCase } = useWorkspace();
  const { axis } = useReport();
  const { figures, lane } = report.cases[gbwCase];
  return (
    <>
      <div className={styles.cardLane}>
        <LaneDrawing lane={lane} axis={axis} verdict={laneVerdict(report.checks, report.verdict.verdict)} />
      </div>
      <span className={styles.cardFigures}>
        <span>
          <FigureText figure={figures.signalGain} />
          {figures.noiseGain.value !== null && (
            <>
              , noise gain <FigureText figure={figures.noiseGain} />
            </>
          )}
        </span>
        <span>
          {report.hasGbw ? (
            <>
              GBW <FigureText figure={figures.headroom} tone={verdictOf(report.checks, 'gbw') ?? undefined} strong />
            </>
          ) : (
            <span className="soft">no GBW</span>
          )}
        </span>
        <span>{report.deviceId !== null && <MoneyText money={report.unitCost} />}</span>
      </span>
    </>
  );
}

function ChainCard() {
  const { gbwCase } = useWorkspace();
  const report = useReport();
  const { figures, lane } = report.cases[gbwCase];
  return (
    <div className={styles.card}>
      <span className={styles.cardHead}>
        <strong>Chain</strong>
        <span className="soft">{report.polarity === 'inverted' ? 'inverted' : 'in phase'}</span>
        <span className={styles.cardVerdict}>
          <VerdictMark verdict={report.verdict.verdict} />
        </span>
      </span>
      <div className={styles.cardLane}>
        <LaneDrawing lane={lane} axis={report.axis} verdict={chainLaneVerdict(report)} />
      </div>
      <span className={styles.cardFigures}>
        <FigureText figure={figures.gainOperating} strong />
        <FigureText figure={figures.cornerUpper} />
        <MoneyText money={report.cost} strong />
      </span>
    </div>
  );
}
