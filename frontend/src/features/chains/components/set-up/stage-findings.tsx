import { Link } from 'react-router-dom';

import type { StageReport } from '../../../../api/types';
import { VerdictIcon } from '../../../../components/verdict-mark';
import { useWorkspace } from '../workspace-context';
import styles from './set-up.module.css';

/** What lacks may as well be a level of the specification, which the device page cannot take. */
function lacksDeviceData(sentence: string): boolean {
  return sentence.includes('device page');
}

/** Every check of this stage that is not clear, in words, with what would help. */
export function StageFindings({ report }: { report: StageReport }) {
  const { edits, editable } = useWorkspace();
  const findings = report.checks.filter((check) => check.verdict !== 'clear');
  const missing = findings.some((check) => check.verdict === 'unknown' && lacksDeviceData(check.sentence));
  if (findings.length === 0) return <p className="soft">Every check of this stage is clear.</p>;
  return (
    <ul className={styles.findings}>
      {findings.map((check) => (
        <li key={check.id}>
          <VerdictIcon verdict={check.verdict} size={14} />
          <div>
            <span className="visually-hidden">{check.verdict}: </span>
            {check.sentence}
            {editable &&
              check.remedies.map(({ action, stages, sentence }) =>
                action && stages ? (
                  <button
                    key={action}
                    type="button"
                    className={styles.textButton}
                    title={sentence}
                    onClick={() => edits.applyRemedy(report.stageId, stages, action)}
                  >
                    {action}
                  </button>
                ) : null,
              )}
          </div>
        </li>
      ))}
      {missing && report.deviceId !== null && (
        <li>
          <Link to={`/devices/${report.deviceId}`}>Enter the missing values of {report.partNumber}</Link>
        </li>
      )}
    </ul>
  );
}
