import type { Band, FrequencyAxis } from '../../../../api/types';
import { bandText, frequencyText } from '../../lib/frequency-text';
import { axisTicks, frequencyScale, labelledTicks } from '../../lib/lane-geometry';
import styles from './lane.module.css';

/** A label needs this fraction of the column to stand by itself. */
const LABEL_ROOM = 0.15;
const EDGE = 0.1;

/** The one axis of all lanes: decades, and the operating band above them. */
export function AxisLabels({ axis, band }: { axis: FrequencyAxis; band: Band }) {
  const x = frequencyScale(axis);
  const middle = (x(band.lowHz) + x(band.highHz)) / 2;
  return (
    <div className={styles.axis}>
      <span className={styles.bandLabel} style={at(Math.min(1 - EDGE, Math.max(EDGE, middle)))}>
        {bandText(band)}
      </span>
      {labelledTicks(axisTicks(axis), LABEL_ROOM).map((tick) => (
        <span key={tick.frequencyHz} className={styles.decade} style={at(tick.at)}>
          {frequencyText(tick.frequencyHz)}
        </span>
      ))}
    </div>
  );
}

/** Labels at the ends lean inwards. */
function at(fraction: number) {
  const lean = fraction < 0.04 ? 0 : fraction > 0.96 ? -100 : -50;
  return { left: `${fraction * 100}%`, transform: `translateX(${lean}%)` };
}
