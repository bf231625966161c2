import type { Curves, Figure } from '../../../../api/types';
import { formatFigure, formatSignificant } from '../../../../lib/format-figure';
import type { PlotBox, PlotScales } from '../../lib/response-geometry';
import { useReport, useWorkspace } from '../workspace-context';
import { RequirementMarks } from './requirement-marks';
import styles from './response.module.css';

interface ChartMarksProps {
  box: PlotBox;
  scales: PlotScales;
  curves: Curves;
}

/** Half power, in decibels: 10·log10(2). */
const HALF_POWER_DB = 10 * Math.log10(2);

/** What the curve is held to: band, required window, ideal gain and −3 dB marks. */
export function ChartMarks({ box, scales, curves }: ChartMarksProps) {
  const { control } = useWorkspace();
  const { band } = control.draft.specification;
  const from = scales.x(band.lowHz);
  const to = scales.x(band.highHz);
  const operating = scales.x(band.operatingHz);
  const bottom = box.height - box.bottom;
  const ideal = curves.idealGainDb;
  return (
    <g>
      <rect className={styles.band} x={from} width={Math.max(2, to - from)} y={box.top} height={bottom - box.top} />
      <line className={styles.operating} x1={operating} x2={operating} y1={box.top} y2={bottom} />
      {ideal !== null && (
        <>
          <line
            className={styles.ideal}
            x1={box.left}
            x2={box.width - box.right}
            y1={scales.y(ideal)}
            y2={scales.y(ideal)}
          />
          <text className={styles.markText} x={box.width - box.right - 4} y={scales.y(ideal) - 5} textAnchor="end">
            ideal {formatSignificant(ideal, 4)}
          </text>
        </>
      )}
      <RequirementMarks scales={scales} curves={curves} />
      {ideal !== null && <CornerMarks scales={scales} gainDb={ideal - HALF_POWER_DB} box={box} />}
    </g>
  );
}

/** A label needs this much room beside its mark. */
const LABEL_WIDTH = 100;

function CornerMarks({ scales, gainDb, box }: { scales: PlotScales; gainDb: number; box: PlotBox }) {
  const { gbwCase } = useWorkspace();
  const { cornerLower, cornerUpper } = useReport().cases[gbwCase].figures;
  return (
    <>
      <CornerMark figure={cornerLower} labelAt="left" y={scales.y(gainDb)} scales={scales} box={box} />
      <CornerMark figure={cornerUpper} labelAt="right" y={scales.y(gainDb)} scales={scales} box={box} />
    </>
  );
}

interface CornerMarkProps {
  figure: Figure;
  labelAt: 'left' | 'right';
  y: number;
  scales: PlotScales;
  box: PlotBox;
}

/** The label stands on the outer side, where the curve has gone down, unless it would run out of the plot. */
function CornerMark({ figure, labelAt, y, scales, box }: CornerMarkProps) {
  if (figure.value === null) return null;
  const x = scales.x(figure.value);
  if (x <= box.left || x >= box.width - box.right) return null;
  const roomLeft = x - box.left > LABEL_WIDTH;
  const roomRight = box.width - box.right - x > LABEL_WIDTH;
  const left = labelAt === 'left' ? roomLeft : !roomRight;
  return (
    <g>
      <line className={styles.corner} x1={x} x2={x} y1={y - 12} y2={y + 12} />
      <text className={styles.markText} x={left ? x - 7 : x + 7} y={y - 8} textAnchor={left ? 'end' : 'start'}>
        −3 dB {formatFigure(figure).text}
      </text>
    </g>
  );
}
