import Input from 'antd/es/input';
import { useState } from 'react';

import type { CandidateReport } from '../../../../api/types';
import { GradeMark } from '../../../../components/data-marks';
import { FigureText } from '../../../../components/figure-text';
import { MoneyText } from '../../../../components/money-text';
import { VerdictIcon, VerdictMark } from '../../../../components/verdict-mark';
import { frequencyText } from '../../lib/frequency-text';
import { useWorkspace } from '../workspace-context';
import styles from './set-up.module.css';

interface DeviceTableProps {
  candidates: readonly CandidateReport[];
  outdated: boolean;
  onChoose: (deviceId: string) => void;
}

function matches(candidate: CandidateReport, words: string): boolean {
  const text = `${candidate.partNumber} ${candidate.grade} ${candidate.verdict}`.toLowerCase();
  return words
    .toLowerCase()
    .split(/\s+/)
    .every((word) => text.includes(word));
}

/** Every device of the library that fits, tried in this very stage; a click or Enter on its name takes it. */
export function DeviceTable({ candidates, outdated, onChoose }: DeviceTableProps) {
  const [filter, setFilter] = useState('');
  const shown = candidates.filter((candidate) => candidate.current || matches(candidate, filter));
  const passing = candidates.filter((candidate) => candidate.verdict === 'clear').length;
  return (
    <>
      <div className={styles.devicesHead}>
        <h3>Devices, each tried in this place</h3>
        <span className="soft">
          {passing} of {candidates.length} pass · cheapest that pass first
        </span>
        <Input
          size="small"
          allowClear
          className={styles.filter}
          placeholder="Filter"
          aria-label="Filter the devices"
          value={filter}
          onChange={(event) => setFilter(event.target.value)}
        />
      </div>
      <div className={styles.devicesScroll}>
        <table className={`data-table ${styles.devices} ${outdated ? styles.outdated : ''}`}>
          <DeviceHead />
          <tbody>
            {shown.map((candidate) => (
              <DeviceRow key={candidate.deviceId} candidate={candidate} onChoose={onChoose} />
            ))}
          </tbody>
        </table>
        {shown.length === 0 && <p className="soft">No device matches “{filter}”.</p>}
      </div>
    </>
  );
}

function DeviceHead() {
  const { control, chain } = useWorkspace();
  return (
    <thead>
      <tr>
        <th scope="col">Device</th>
        <th scope="col" className="number">
          GBW
        </th>
        <th scope="col" className="number">
          Headroom
        </th>
        <th scope="col" className="number">
          Corner
        </th>
        <th scope="col" className="number">
          dB at {frequencyText(control.draft.specification.band.operatingHz)}
        </th>
        <th scope="col">Then</th>
        <th scope="col" className={`number ${styles.money}`}>
          {chain.currency}
        </th>
        <th scope="col">Here</th>
      </tr>
    </thead>
  );
}

function DeviceRow({ candidate, onChoose }: { candidate: CandidateReport; onChoose: (deviceId: string) => void }) {
  const { editable } = useWorkspace();
  const { current, verdict, reason } = candidate;
  const choose = () => editable && !current && onChoose(candidate.deviceId);
  return (
    <tr className={current ? styles.currentDevice : styles.device} onClick={choose} aria-current={current || undefined}>
      <th scope="row">
        <button type="button" className={styles.deviceName} disabled={current || !editable} onClick={choose}>
          {candidate.partNumber}
        </button>{' '}
        <GradeMark grade={candidate.grade} /> {current && <span className="soft">now</span>}
      </th>
      <td className="number">
        <FigureText figure={candidate.gbwHave} />
      </td>
      <td className="number">
        <FigureText figure={candidate.headroom} />
      </td>
      <td className="number">
        <FigureText figure={candidate.cornerUpper} />
      </td>
      <td className="number">
        <FigureText figure={candidate.droopOperating} hideUnit />
      </td>
      <td className={styles.then}>
        <span className={styles.thenChain}>
          {candidate.chainVerdict !== verdict && <VerdictIcon verdict={candidate.chainVerdict} size={12} />}
          <span>
            <span className="visually-hidden">chain {candidate.chainVerdict}: </span>
            {candidate.chainText}
          </span>
        </span>
        {reason && (
          <div className={styles.reason} title={reason}>
            {reason}
          </div>
        )}
      </td>
      <td className="number">
        <MoneyText money={candidate.unitCost} hideCurrency />
      </td>
      <td>
        <VerdictMark verdict={verdict} title={reason} />
      </td>
    </tr>
  );
}
