import Checkbox from 'antd/es/checkbox';

import { useReport } from '../workspace-context';
import styles from './response.module.css';
import { stageStroke } from './stage-stroke';

interface StageTogglesProps {
  shown: readonly string[];
  onChange: (shown: readonly string[]) => void;
}

export function StageToggles({ shown, onChange }: StageTogglesProps) {
  const { stages } = useReport();
  const toggle = (stageId: string, on: boolean) =>
    onChange(on ? [...shown, stageId] : shown.filter((each) => each !== stageId));
  return (
    <fieldset className={styles.toggles}>
      <legend className="visually-hidden">Stages drawn beside the chain</legend>
      <span className="soft">Stages:</span>
      {stages.map((stage, index) => (
        <Checkbox
          key={stage.stageId}
          checked={shown.includes(stage.stageId)}
          onChange={(event) => toggle(stage.stageId, event.target.checked)}
        >
          {stage.label} {stage.name}
          <svg width="22" height="8" aria-hidden="true" className={styles.swatch}>
            <line x1="0" x2="22" y1="4" y2="4" {...stageStroke(index)} />
          </svg>
        </Checkbox>
      ))}
    </fieldset>
  );
}
