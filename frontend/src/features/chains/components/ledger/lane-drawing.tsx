import type { FrequencyAxis, Lane, Verdict } from '../../../../api/types';
import { axisTicks, laneGeometry, unlimitedLane, type LaneGeometry, type Span } from '../../lib/lane-geometry';
import { fadeOf, hatchOf } from './lane-defs';
import styles from './lane.module.css';

const percent = (fraction: number): string => `${(fraction * 100).toFixed(3)}%`;

interface LaneDrawingProps {
  lane: Lane;
  axis: FrequencyAxis;
  verdict: Verdict;
  /** Half the height of the bar in pixels. */
  halfHeight?: number;
}

/** One stage on the shared frequency axis. Horizontal positions are fractions, so it fits every width undistorted. */
export function LaneDrawing({ lane, axis, verdict, halfHeight = 6 }: LaneDrawingProps) {
  const known = lane.cornerHz !== null || lane.solidToHz !== null;
  const geometry = known || verdict === 'unknown' ? laneGeometry(lane, axis) : unlimitedLane(lane, axis);
  return (
    <svg className={styles.lane} role="img" aria-label={lane.description} focusable="false">
      <title>{lane.description}</title>
      <LaneBackground axis={axis} geometry={geometry} />
      <svg y="50%" overflow="visible">
        {known || verdict !== 'unknown' ? (
          <LaneBar geometry={geometry} verdict={verdict} half={halfHeight} />
        ) : (
          <line x1="0" x2="100%" className={`${styles.dashed} ${styles.unknown}`} />
        )}
      </svg>
    </svg>
  );
}

export function LaneBackground({ axis, geometry }: { axis: FrequencyAxis; geometry: Pick<LaneGeometry, 'band'> }) {
  const { band } = geometry;
  return (
    <>
      <rect className={styles.band} x={percent(band.from)} width={percent(band.to - band.from)} height="100%" />
      {axisTicks(axis).map(({ at, frequencyHz }) => (
        <line key={frequencyHz} className={styles.grid} x1={percent(at)} x2={percent(at)} y1="0" y2="100%" />
      ))}
    </>
  );
}

interface LaneBarProps {
  geometry: LaneGeometry;
  verdict: Verdict;
  half: number;
}

function LaneBar({ geometry, verdict, half }: LaneBarProps) {
  const { solid, fading, startsInside } = geometry;
  const whole = solid && fading ? { from: solid.from, to: fading.to } : (solid ?? fading);
  return (
    <g className={styles[verdict]}>
      <Bar span={solid} half={half} fill="currentColor" />
      <Bar span={fading} half={half} fill={fadeOf(verdict)} />
      {verdict !== 'clear' && <Bar span={whole} half={half} fill={hatchOf(verdict)} />}
      {startsInside && whole && <line className={styles.start} {...vertical(whole.from, half + 2)} />}
      <LaneEnds geometry={geometry} half={half} />
    </g>
  );
}

function Bar({ span, half, fill }: { span: Span | null; half: number; fill: string }) {
  if (!span) return null;
  return <rect x={percent(span.from)} width={percent(span.to - span.from)} y={-half} height={2 * half} fill={fill} />;
}

/** The corner, the same for the typical device, and the sign that a lane goes on beyond the axis. */
function LaneEnds({ geometry, half }: { geometry: LaneGeometry; half: number }) {
  const { tick, typicalTick, openEnded } = geometry;
  return (
    <>
      {typicalTick !== null && <TypicalTick at={typicalTick} half={half + 3} />}
      {tick !== null && <line className={styles.tick} {...vertical(tick, half + 5)} />}
      {openEnded && (
        <svg x="100%" overflow="visible">
          <path className={styles.onward} d={`M-7 ${-half + 1} -1 0 -7 ${half - 1}`} />
        </svg>
      )}
    </>
  );
}

function vertical(at: number, reach: number) {
  return { x1: percent(at), x2: percent(at), y1: -reach, y2: reach };
}

/** Open: the part as it usually comes, not as it may come. */
function TypicalTick({ at, half }: { at: number; half: number }) {
  return (
    <svg x={percent(at)} overflow="visible">
      <rect className={styles.typical} x={-1.5} width={3} y={-half} height={2 * half} />
    </svg>
  );
}
