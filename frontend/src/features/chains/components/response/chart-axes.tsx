import { formatSignificant } from '../../../../lib/format-figure';
import { frequencyText } from '../../lib/frequency-text';
import { frequencyTicks, gainTicks, type PlotBox, type PlotScales } from '../../lib/response-geometry';
import { useWorkspace } from '../workspace-context';
import styles from './response.module.css';

interface ChartAxesProps {
  box: PlotBox;
  scales: PlotScales;
  frequencyRange: readonly [number, number];
  gainRange: readonly [number, number];
}

export function ChartAxes({ box, scales, frequencyRange, gainRange }: ChartAxesProps) {
  const { control } = useWorkspace();
  const bottom = box.height - box.bottom;
  const ticks = frequencyTicks(frequencyRange);
  const wide = ticks.filter((tick) => tick.decade).length >= 2;
  const unit = control.draft.specification.source.kind === 'current' ? 'dBΩ' : 'dB';
  return (
    <g className={styles.axes}>
      {ticks.map(({ frequencyHz, decade }) => {
        const x = scales.x(frequencyHz);
        return (
          <g key={frequencyHz}>
            <line className={decade ? styles.major : styles.minor} x1={x} x2={x} y1={box.top} y2={bottom} />
            {(decade || !wide) && (
              <text x={x} y={bottom + 18} textAnchor="middle">
                {frequencyText(frequencyHz)}
              </text>
            )}
          </g>
        );
      })}
      {gainTicks(gainRange).map((gain) => (
        <g key={gain}>
          <line
            className={styles.minor}
            x1={box.left}
            x2={box.width - box.right}
            y1={scales.y(gain)}
            y2={scales.y(gain)}
          />
          <text x={box.left - 8} y={scales.y(gain) + 4} textAnchor="end">
            {gain === 0 ? '0' : formatSignificant(gain, 3).replace(/\.0+$/, '')}
          </text>
        </g>
      ))}
      <text x={box.left - 8} y={14} textAnchor="end">
        {unit}
      </text>
    </g>
  );
}
