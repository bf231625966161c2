import styles from './lane.module.css';

/** What a lane says, in the same marks. */
export function LaneLegend({ headroomTarget, bandwidthTarget }: { headroomTarget: number; bandwidthTarget: number }) {
  return (
    <ul className={styles.legend} aria-label="How to read the lanes">
      <li>
        <svg width="22" height="10" className={styles.clear} aria-hidden="true">
          <rect width="22" height="10" fill="currentColor" />
        </svg>
        the team’s target is met (headroom ×{headroomTarget}, without GBW bandwidth ×{bandwidthTarget})
      </li>
      <li>
        <svg width="22" height="10" className={styles.clear} aria-hidden="true">
          <rect width="22" height="10" fill="url(#lane-fade-clear)" />
        </svg>
        down to the corner
      </li>
      <li>
        <svg width="6" height="16" className={styles.clear} aria-hidden="true">
          <line className={styles.tick} x1="3" x2="3" y1="0" y2="16" />
        </svg>
        corner
      </li>
      <li>
        <svg width="6" height="16" aria-hidden="true">
          <rect className={styles.typical} x="1.5" y="0.5" width="3" height="15" />
        </svg>
        the same, typical device
      </li>
      <li>
        <svg width="14" height="16" aria-hidden="true">
          <rect className={styles.band} width="14" height="16" />
        </svg>
        operating band
      </li>
    </ul>
  );
}
