import { useState, type KeyboardEvent, type PointerEvent, type ReactNode } from 'react';

import type { Curves } from '../../../../api/types';
import {
  curvePath,
  envelopePath,
  gainRange,
  nearestIndex,
  plotScales,
  type PlotBox,
  type PlotScales,
} from '../../lib/response-geometry';
import { useReport, useWorkspace } from '../workspace-context';
import { ChartAxes } from './chart-axes';
import { ChartMarks } from './chart-marks';
import { Readout } from './readout';
import styles from './response.module.css';
import { stageStroke } from './stage-stroke';
import { useWidth } from './use-width';

interface ResponseChartProps {
  curves: Curves;
  shownStages: readonly string[];
  /** Around the band: the gain range closes in as well. */
  closeUp: boolean;
}

const HEIGHT = 430;
const MARGINS = { left: 46, right: 14, top: 26, bottom: 34 } as const;
/** Half the height of the close-up around the wanted gain. */
const CLOSE_UP_DB = 4;

function useGainRange({ curves, shownStages, closeUp }: ResponseChartProps): [number, number] {
  const { control, gbwCase } = useWorkspace();
  const { requirements } = control.draft.specification;
  const chain = curves.chain[gbwCase].gainDb;
  const target = requirements.gainDb?.target ?? curves.idealGainDb;
  if (closeUp && shownStages.length === 0 && target !== null) {
    const tolerance = requirements.gainDb?.tolerance ?? 0;
    const lowest = Math.min(...chain.filter((value) => value !== null), target);
    const reach = Math.max(CLOSE_UP_DB, tolerance * 2);
    return [Math.max(Math.floor(lowest - 1), Math.floor(target - 3 * reach)), Math.ceil(target + reach / 2)];
  }
  const stages = curves.stages.filter((stage) => shownStages.includes(stage.stageId));
  const { gainDb } = requirements;
  const required = gainDb ? [gainDb.target - gainDb.tolerance, gainDb.target + gainDb.tolerance] : [];
  return gainRange([chain, ...stages.map((stage) => stage.cases[gbwCase].gainDb)], required);
}

export function ResponseChart(props: ResponseChartProps) {
  const { curves } = props;
  const [frame, width] = useWidth<HTMLDivElement>();
  const [index, setIndex] = useState<number | null>(null);
  const range = useGainRange(props);
  const box: PlotBox = { width, height: HEIGHT, ...MARGINS };
  const { frequenciesHz } = curves;
  const from = frequenciesHz[0] ?? 1;
  const to = frequenciesHz.at(-1) ?? 10;
  const scales = plotScales(box, [from, to], range);

  const point = (event: PointerEvent<SVGSVGElement>) => {
    const px = event.clientX - event.currentTarget.getBoundingClientRect().left;
    setIndex(nearestIndex(frequenciesHz, scales.frequencyAt(px)));
  };
  const step = (event: KeyboardEvent) => {
    const by = { ArrowLeft: -4, ArrowRight: 4 }[event.key];
    if (by === undefined) return;
    event.preventDefault();
    const start = index ?? Math.floor(frequenciesHz.length / 2);
    setIndex(Math.max(0, Math.min(frequenciesHz.length - 1, start + by)));
  };

  return (
    <div ref={frame} className={styles.frame}>
      {width > 0 && (
        <svg
          className={styles.chart}
          width={width}
          height={HEIGHT}
          role="img"
          tabIndex={0}
          aria-label="Gain over frequency of the chain. Arrow keys move the readout; the table has the same figures."
          onPointerMove={point}
          onPointerLeave={() => setIndex(null)}
          onKeyDown={step}
          onBlur={() => setIndex(null)}
        >
          <ChartAxes box={box} scales={scales} frequencyRange={[from, to]} gainRange={range} />
          <PlotArea box={box}>
            <ChartMarks box={box} scales={scales} curves={curves} />
            <ChartCurves {...props} scales={scales} />
          </PlotArea>
          {index !== null && <Crosshair box={box} scales={scales} curves={curves} index={index} />}
        </svg>
      )}
      <Readout curves={curves} shownStages={props.shownStages} index={index} />
    </div>
  );
}

/** What runs out of the axes is cut off there. */
function PlotArea({ box, children }: { box: PlotBox; children: ReactNode }) {
  return (
    <g clipPath="url(#plot-area)">
      <clipPath id="plot-area">
        <rect
          x={box.left}
          y={box.top}
          width={Math.max(0, box.width - box.left - box.right)}
          height={box.height - box.top - box.bottom}
        />
      </clipPath>
      {children}
    </g>
  );
}

function ChartCurves({ curves, shownStages, scales }: ResponseChartProps & { scales: PlotScales }) {
  const { gbwCase } = useWorkspace();
  const report = useReport();
  const { frequenciesHz, chain } = curves;
  const cases = [chain.typical.gainDb, chain.minimum.gainDb, chain.minimumHot.gainDb];
  return (
    <g>
      <path className={styles.envelope} d={envelopePath(scales, frequenciesHz, cases)} />
      {curves.stages.map(
        (stage) =>
          shownStages.includes(stage.stageId) && (
            <path
              key={stage.stageId}
              fill="none"
              d={curvePath(scales, frequenciesHz, stage.cases[gbwCase].gainDb)}
              {...stageStroke(report.stages.findIndex((each) => each.stageId === stage.stageId))}
            />
          ),
      )}
      <path className={styles.chainCurve} d={curvePath(scales, frequenciesHz, chain[gbwCase].gainDb)} />
    </g>
  );
}

interface CrosshairProps {
  box: PlotBox;
  scales: PlotScales;
  curves: Curves;
  index: number;
}

function Crosshair({ box, scales, curves, index }: CrosshairProps) {
  const { gbwCase } = useWorkspace();
  const x = scales.x(curves.frequenciesHz[index] ?? 0);
  const gain = curves.chain[gbwCase].gainDb[index];
  return (
    <g>
      <line className={styles.crosshair} x1={x} x2={x} y1={box.top} y2={box.height - box.bottom} />
      {typeof gain === 'number' && <circle className={styles.dot} cx={x} cy={scales.y(gain)} r="3.5" />}
    </g>
  );
}
