import type { Curves } from '../../../../api/types';
import { allowedByFlatness, requiredGain, type GainWindow } from '../../lib/requirement-windows';
import type { PlotScales } from '../../lib/response-geometry';
import { useReport, useWorkspace } from '../workspace-context';
import styles from './response.module.css';

/** Half the width of the gain requirement's bracket, which stands for one frequency. */
const BRACKET_PX = 11;

/** Gain is required at the operating frequency alone, flatness over the whole band. */
export function RequirementMarks({ scales, curves }: { scales: PlotScales; curves: Curves }) {
  const { control, gbwCase } = useWorkspace();
  const { gainLow, gainHigh } = useReport().cases[gbwCase].figures;
  const { specification } = control.draft;
  const { band, requirements } = specification;
  const operating = scales.x(band.operatingHz);
  const gain = requiredGain(requirements);
  const edges = [gainLow.value, gainHigh.value];
  const flat = allowedByFlatness(specification, curves.frequenciesHz, curves.chain[gbwCase].gainDb, edges);
  return (
    <>
      {flat && (
        <Bracket
          className={styles.flatness}
          scales={scales}
          within={flat}
          from={scales.x(band.lowHz)}
          to={scales.x(band.highHz)}
        />
      )}
      {gain && (
        <Bracket
          className={styles.required}
          scales={scales}
          within={gain}
          from={operating - BRACKET_PX}
          to={operating + BRACKET_PX}
        />
      )}
    </>
  );
}

interface BracketProps {
  className: string | undefined;
  scales: PlotScales;
  within: GainWindow;
  from: number;
  to: number;
}

function Bracket({ className, scales, within, from, to }: BracketProps) {
  const { lowDb, highDb } = within;
  return (
    <g className={className}>
      {highDb !== undefined && (
        <path d={`M${from} ${scales.y(highDb) - 5}V${scales.y(highDb)}H${to}V${scales.y(highDb) - 5}`} />
      )}
      {lowDb !== undefined && (
        <path d={`M${from} ${scales.y(lowDb) + 5}V${scales.y(lowDb)}H${to}V${scales.y(lowDb) + 5}`} />
      )}
    </g>
  );
}
