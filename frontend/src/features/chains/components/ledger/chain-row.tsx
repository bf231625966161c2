import type { ChainFigureKey } from '../../../../api/types';
import { FigureText } from '../../../../components/figure-text';
import { MoneyText } from '../../../../components/money-text';
import { VerdictMark } from '../../../../components/verdict-mark';
import { formatFigure } from '../../../../lib/format-figure';
import { chainLaneVerdict, toneOf } from '../../lib/verdicts';
import { useReport, useWorkspace } from '../workspace-context';
import { LaneDrawing } from './lane-drawing';
import styles from './ledger.module.css';

function ChainFigure({ figure, title, hideUnit }: { figure: ChainFigureKey; title: string; hideUnit?: boolean }) {
  const { gbwCase, openWorking } = useWorkspace();
  const report = useReport();
  return (
    <FigureText
      figure={report.cases[gbwCase].figures[figure]}
      name={`Chain ${title}`}
      strong
      hideUnit={hideUnit}
      onOpen={() => openWorking(null, figure, `${title}, chain`)}
    />
  );
}

function SupplyText() {
  const { control, openWorking, gbwCase } = useWorkspace();
  const report = useReport();
  const { supplyCurrentA } = control.draft.specification.requirements;
  const figure = report.cases[gbwCase].figures.supplyCurrent;
  const limit =
    supplyCurrentA === undefined ? null : formatFigure({ value: supplyCurrentA, unit: 'A', digits: 3 }).text;
  return (
    <span className={styles.supply}>
      supply{' '}
      <FigureText
        figure={figure}
        name="Chain supply current"
        tone={toneOf(report.checks, 'supply-current')}
        onOpen={() => openWorking(null, 'supplyCurrent', 'Supply current, chain')}
      />
      {limit && ` of ${limit}`}
    </span>
  );
}

/** The last row: what the stages make together. */
export function ChainRow() {
  const { gbwCase, openWorking } = useWorkspace();
  const report = useReport();
  const { verdict } = report;
  return (
    <tfoot>
      <tr className={styles.chain}>
        <th scope="row" className={styles.stage}>
          <div className={styles.stageCell}>
            <span className={styles.handle} />
            <span>
              Chain <span className={styles.polarity}>{report.polarity === 'inverted' ? 'inverted' : 'in phase'}</span>
            </span>
          </div>
        </th>
        <td className={styles.number} colSpan={2} title={report.gainBasisText}>
          <ChainFigure figure="idealGain" title="Ideal gain" />
        </td>
        <td className={styles.purse}>
          <SupplyText />
        </td>
        <td className={styles.number}>
          <ChainFigure figure="cornerUpper" title="Upper corner" />
        </td>
        <td className={styles.number}>
          <ChainFigure figure="gainOperating" title="Gain at the operating frequency" hideUnit />
        </td>
        <td className={styles.lane}>
          <div className={styles.laneBox}>
            <LaneDrawing lane={report.cases[gbwCase].lane} axis={report.axis} verdict={chainLaneVerdict(report)} />
          </div>
        </td>
        <td />
        <td />
        <td className={styles.wide} />
        <td className={styles.wider} />
        <td className={styles.wider} />
        <td className={`${styles.wider} ${styles.number}`}>
          <ChainFigure figure="supplyCurrent" title="Supply current" />
        </td>
        <td className={`${styles.number} ${styles.cost}`}>
          <MoneyText
            money={report.cost}
            name="Cost of the chain"
            hideCurrency
            strong
            onOpen={() => openWorking(null, 'cost', 'Cost of the chain')}
          />
        </td>
        <td className={styles.verdict}>
          <VerdictMark verdict={verdict.verdict} title={`${verdict.lead} ${verdict.text}`.trim()} />
        </td>
      </tr>
    </tfoot>
  );
}
