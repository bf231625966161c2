import type { FrequencyAxis, Lane, Verdict } from '../../../../api/types';
import { axisTicks, laneGeometry, unlimitedLane, type LaneGeometry } from '../../lib/lane-geometry';
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

function LaneBar({ geometry, verdict, half }: { geometry: LaneGeometry; verdict: Verdict; half: number }) {
  const { solid, fading, tick, typicalTick, startsInside, openEnded } = geometry;
  const start = solid?.from ?? fading?.from;
  const end = fading?.to ?? solid?.to;
  return (
    <g className={styles[verdict]}>
      {solid && (
        <rect
          x={percent(solid.from)}
          width={percent(solid.to - solid.from)}
          y={-half}
          height={2 * half}
          fill="currentColor"
        />
      )}
      {fading && (
        <rect
          x={percent(fading.from)}
          width={percent(fading.to - fading.from)}
          y={-half}
          height={2 * half}
          fill={fadeOf(verdict)}
        />
      )}
      {start !== undefined && end !== undefined && verdict !== 'clear' && (
        <rect x={percent(start)} width={percent(end - start)} y={-half} height={2 * half} fill={hatchOf(verdict)} />
      )}
      {startsInside && start !== undefined && <line className={styles.start} {...vertical(start, half + 2)} />}
      {typicalTick !== null && <TypicalTick at={typicalTick} half={half + 3} />}
      {tick !== null && <line className={styles.tick} {...vertical(tick, half + 5)} />}
      {openEnded && (
        <svg x="100%" overflow="visible">
          <path className={styles.onward} d={`M-7 ${-half + 1} -1 0 -7 ${half - 1}`} />
        </svg>
      )}
    </g>
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
