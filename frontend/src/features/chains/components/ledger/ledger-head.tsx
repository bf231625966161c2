import { frequencyText, gbwColumnTitle } from '../../lib/frequency-text';
import { useReport, useWorkspace } from '../workspace-context';
import { AxisLabels } from './axis-labels';
import styles from './ledger.module.css';

export function LedgerHead() {
  const { control, gbwCase, chain } = useWorkspace();
  const report = useReport();
  const { band } = control.draft.specification;
  return (
    <thead>
      <tr>
        <th scope="col" className={styles.stage}>
          <span className={styles.stageHead}>Stage, device</span>
        </th>
        <th scope="col" className={styles.gain}>
          Gain set
        </th>
        <th scope="col" className={styles.noiseGain}>
          Noise gain
        </th>
        <th scope="col" className={styles.purse}>
          {gbwColumnTitle(report.stages, gbwCase, band)}
        </th>
        <th scope="col" className={styles.corner}>
          Corner
        </th>
        <th scope="col" className={styles.gainAt}>
          At {frequencyText(band.operatingHz)}, running dB
        </th>
        <th scope="col" className={styles.lane}>
          <span className="visually-hidden">Lane on the frequency axis</span>
          <AxisLabels axis={report.axis} band={band} />
        </th>
        <th scope="col" className={styles.level}>
          Swing
        </th>
        <th scope="col" className={styles.level}>
          Slew
        </th>
        <th scope="col" className={styles.wide}>
          Noise share
        </th>
        <th scope="col" className={styles.wider}>
          Phase margin
        </th>
        <th scope="col" className={styles.wider}>
          Loop gain
        </th>
        <th scope="col" className={styles.wider}>
          Supply
        </th>
        <th scope="col" className={styles.cost}>
          <span className={styles.money}>{chain.currency}</span>
        </th>
        <th scope="col" className={styles.verdict}>
          Verdict
        </th>
      </tr>
    </thead>
  );
}
