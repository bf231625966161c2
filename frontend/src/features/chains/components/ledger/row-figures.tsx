import type { CheckId, Figure, StageFigureKey, StageReport } from '../../../../api/types';
import { DataMarks } from '../../../../components/data-marks';
import { FigureText } from '../../../../components/figure-text';
import { MoneyText } from '../../../../components/money-text';
import { VerdictMark } from '../../../../components/verdict-mark';
import { laneVerdict, toneOf } from '../../lib/verdicts';
import { useReport, useWorkspace } from '../workspace-context';
import { LaneDrawing } from './lane-drawing';
import styles from './ledger.module.css';
import { Purse } from './purse';

interface FigureCellProps {
  report: StageReport;
  figure: StageFigureKey;
  title: string;
  checks?: readonly CheckId[];
  hideUnit?: boolean;
  className?: string;
}

function useOpenFigure(report: StageReport): (figure: string, title: string) => void {
  const { openWorking } = useWorkspace();
  return (figure, title) => openWorking(report.stageId, figure, `${title}, ${report.label} ${report.name}`);
}

function StageFigure({ report, figure, title, checks = [], hideUnit }: Omit<FigureCellProps, 'className'>) {
  const { gbwCase } = useWorkspace();
  const open = useOpenFigure(report);
  const shown: Figure = report.cases[gbwCase].figures[figure];
  return (
    <FigureText
      figure={shown}
      name={`${report.label} ${title}`}
      tone={toneOf(report.checks, ...checks)}
      hideUnit={hideUnit}
      onOpen={() => open(figure, title)}
    />
  );
}

function FigureCell({ className, ...figure }: FigureCellProps) {
  return (
    <td className={`${styles.number} ${className ?? ''}`}>
      <StageFigure {...figure} />
    </td>
  );
}

const LEVEL_CHECKS: readonly CheckId[] = ['swing', 'compression'];

export function RowFigures({ report }: { report: StageReport }) {
  const { gbwCase } = useWorkspace();
  const chain = useReport();
  const open = useOpenFigure(report);
  return (
    <>
      <FigureCell report={report} figure="signalGain" title="Gain set" />
      <FigureCell report={report} figure="noiseGain" title="Noise gain" />
      <td className={styles.purse}>
        <Purse report={report} gbwCase={gbwCase} onOpen={open} />
      </td>
      <FigureCell report={report} figure="cornerUpper" title="Corner" checks={['bandwidth']} />
      <td className={styles.number}>
        <StageFigure report={report} figure="gainOperating" title="Gain at the operating frequency" hideUnit />
        <div className={styles.second}>
          <StageFigure report={report} figure="runningGain" title="Running gain" hideUnit />
        </div>
      </td>
      <td className={styles.lane}>
        <div className={styles.laneBox}>
          <LaneDrawing
            lane={report.cases[gbwCase].lane}
            axis={chain.axis}
            verdict={laneVerdict(report.checks, report.verdict.verdict)}
          />
        </div>
      </td>
      <FigureCell report={report} figure="swingHeadroom" title="Swing headroom" checks={LEVEL_CHECKS} />
      <FigureCell report={report} figure="slewHeadroom" title="Slew headroom" checks={['slew']} />
      <FigureCell report={report} figure="noiseShare" title="Noise share" className={styles.wide} />
      <FigureCell
        report={report}
        figure="phaseMargin"
        title="Phase margin"
        checks={['stability']}
        className={styles.wider}
      />
      <FigureCell report={report} figure="loopGain" title="Loop gain" checks={['loop-gain']} className={styles.wider} />
      <FigureCell report={report} figure="supplyCurrent" title="Supply current" className={styles.wider} />
      <td className={`${styles.number} ${styles.cost}`}>
        {report.deviceId === null ? null : (
          <MoneyText
            money={report.unitCost}
            name={`${report.label} unit cost`}
            hideCurrency
            onOpen={() => open('unitCost', 'Unit cost')}
          />
        )}
      </td>
      <td className={styles.verdict}>
        <VerdictMark verdict={report.verdict.verdict} title={`${report.verdict.lead} ${report.verdict.text}`.trim()} />
        <DataMarks marks={report.marks} />
      </td>
    </>
  );
}
