import { GBW_CASES, type Curves } from '../../../../api/types';
import { formatSignificant, formatValue } from '../../../../lib/format-figure';
import { CASE_NAMES } from '../frame/section-bar';
import { useWorkspace } from '../workspace-context';
import styles from './response.module.css';

/** Every tenth point: the same curve in figures. */
const EVERY = 10;

const cell = (value: number | null | undefined): string =>
  typeof value === 'number' ? (Math.abs(value) < 0.005 ? '0.00' : formatSignificant(value, 4)) : '–';

export function ResponseTable({ curves, shownStages }: { curves: Curves; shownStages: readonly string[] }) {
  const { gbwCase } = useWorkspace();
  const stages = curves.stages.filter((stage) => shownStages.includes(stage.stageId));
  const rows = curves.frequenciesHz.map((_frequency, index) => index).filter((index) => index % EVERY === 0);
  return (
    <div className="table-scroll">
      <table className={`data-table ${styles.table}`}>
        <caption>Gain in dB; phase and stages for the {CASE_NAMES[gbwCase]} case</caption>
        <thead>
          <tr>
            <th scope="col" className="number">
              Frequency
            </th>
            {GBW_CASES.map((each) => (
              <th key={each} scope="col" className="number">
                Chain, {CASE_NAMES[each]}
              </th>
            ))}
            <th scope="col" className="number">
              Phase, °
            </th>
            {stages.map((stage) => (
              <th key={stage.stageId} scope="col" className="number">
                {stage.label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((index) => (
            <tr key={index}>
              <th scope="row" className="number">
                {formatValue(curves.frequenciesHz[index] ?? 0, 'Hz', 4)}
              </th>
              {GBW_CASES.map((each) => (
                <td key={each} className="number">
                  {cell(curves.chain[each].gainDb[index])}
                </td>
              ))}
              <td className="number">{cell(curves.chain[gbwCase].phaseDeg[index])}</td>
              {stages.map((stage) => (
                <td key={stage.stageId} className="number">
                  {cell(stage.cases[gbwCase].gainDb[index])}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
