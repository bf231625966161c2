import type { DatasheetValue } from '../../calculator/engine';
import { CURRENT_FEEDBACK_TABLE, MATCHED_BLOCK_TABLE } from './other-device-tables';
import { linesOf, withoutAbsent } from './table-cells';
import type { TableCells } from './table-cells';
import { VOLTAGE_FEEDBACK_TABLE } from './voltage-feedback-table';

/** A device of the demo: the body of the device form and its price. */
export interface DemoDevice {
  readonly part: string;
  readonly body: Readonly<Record<string, unknown>>;
  /** USD for one at 250 pieces; undefined: no quote. */
  readonly price: number | undefined;
}

const MAKERS: Readonly<Record<string, string>> = {
  QUIL: 'Quillon Semiconductor',
  MRWG: 'Marrowgate Devices',
  TLYR: 'Tellyra RF',
};

const makerOf = (part: string): string | undefined => MAKERS[part.slice(0, 4)];
const gradeOf = (part: string): string => (part.startsWith('MRWG') ? 'general-purpose' : 'rf');

interface Head {
  readonly part: string;
  readonly package: string;
  readonly channels: number;
  readonly page: number;
}

function headOf(line: TableCells): Head {
  return { part: line.text(), package: line.text(), channels: line.required(), page: line.required() };
}

const identity = ({ part, channels, package: housing }: Head) => ({
  partNumber: part,
  maker: makerOf(part),
  grade: gradeOf(part),
  package: housing,
  channels,
});

const rails = (value: DatasheetValue | undefined) => ({ headroomPositiveV: value, headroomNegativeV: value });

function voltageFeedback(line: TableCells): DemoDevice {
  const head = headOf(line);
  const { part, page } = head;
  const characteristics = {
    gainBandwidthHz: line.minTyp(page, 6, 'small signal, RL = 1 kΩ'),
    minimumStableGain: line.required(),
    phaseMarginDeg: line.number(),
    openLoopGainDb: line.minTyp(page - 1, 0, 'RL = 1 kΩ'),
    slewRateVPerS: line.minTyp(page, 6, '2 V step'),
    voltageNoiseVPerRtHz: line.typical(page + 1, -9, 'f = 1 MHz'),
    currentNoiseAPerRtHz: line.typical(page + 1, -12, 'f = 1 MHz'),
    voltageNoiseCornerHz: line.number(3),
    outputResistanceOhm: line.typical(page + 2, 0, 'open loop, f = 1 MHz'),
  };
  const [commonMode, differential] = line.text().split(' ');
  const picofarad = (cell: string | undefined): DatasheetValue | undefined =>
    cell === undefined || cell === '-' ? undefined : { typ: Number(`${cell}e-12`), page: String(page + 1) };
  const limits = {
    commonModeCapacitanceF: picofarad(commonMode),
    differentialCapacitanceF: picofarad(differential),
    inputResistanceOhm: line.typical(page + 1, 6),
    ...rails(line.typMax(page + 1, 0, 'RL = 500 Ω')),
    outputCurrentA: line.minTyp(page + 1, -3),
    inputOffsetVoltageV: line.typMax(page - 1, -3),
    inputBiasCurrentA: line.typMax(page - 1, -6),
    supplyVoltageV: line.minMax(page - 1),
    supplyCurrentA: line.typMax(page - 1, -3, 'no load'),
  };
  const body = withoutAbsent({ kind: 'voltage-feedback', ...identity(head), ...characteristics, ...limits });
  return { part, body, price: line.number() };
}

function currentFeedback(line: TableCells): DemoDevice {
  const head = headOf(line);
  const { part, page } = head;
  const values = {
    referenceBandwidthHz: line.minTyp(page, 6, 'reference circuit, RL = 500 Ω'),
    referenceNoiseGain: line.required(),
    referenceFeedbackOhm: line.required(),
    invertingInputResistanceOhm: line.typical(page + 1),
    openLoopTransimpedanceOhm: line.minTyp(page - 1, 3),
    slewRateVPerS: line.minTyp(page, 6, '4 V step'),
    voltageNoiseVPerRtHz: line.typical(page + 1, -9, 'f = 1 MHz'),
  };
  const [plus, minus] = line.text().split(' ');
  const picoampere = (cell: string | undefined): DatasheetValue | undefined =>
    cell === undefined || cell === '-' ? undefined : { typ: Number(`${cell}e-12`), page: String(page + 1) };
  const limits = {
    currentNoiseAPerRtHz: picoampere(plus),
    invertingCurrentNoiseAPerRtHz: picoampere(minus),
    outputResistanceOhm: line.typical(page + 2, 0, 'open loop'),
    commonModeCapacitanceF: line.typical(page + 1, -12),
    ...rails(line.typMax(page + 1, 0, 'RL = 500 Ω')),
    outputCurrentA: line.minTyp(page + 1, -3),
    inputOffsetVoltageV: line.typMax(page - 1, -3),
    inputBiasCurrentA: line.typMax(page - 1, -6),
    invertingBiasCurrentA: line.typMax(page - 1, -6),
    supplyVoltageV: line.minMax(page - 1),
    supplyCurrentA: line.typMax(page - 1, -3, 'no load'),
  };
  const body = withoutAbsent({ kind: 'current-feedback', ...identity(head), ...values, ...limits });
  return { part, body, price: line.number() };
}

function matchedBlock(line: TableCells): DemoDevice {
  const part = line.text();
  const housing = line.text();
  const grade = line.text();
  const page = line.required();
  const body = withoutAbsent({
    kind: 'matched-block',
    partNumber: part,
    maker: makerOf(part),
    grade,
    package: housing,
    channels: 1,
    impedanceOhm: line.required(),
    gainDb: line.minTyp(page),
    lowerCornerHz: line.typical(page, 6),
    upperCornerHz: line.typical(page, 6),
    noiseFigureDb: line.typMax(page),
    outputP1dbDbm: line.typical(page),
    outputIp3Dbm: line.typical(page),
    supplyVoltageV: line.minMax(page),
    supplyCurrentA: line.typMax(page, -3),
  });
  return { part, body, price: line.number() };
}

/** The whole invented library. */
export function demoDevices(): DemoDevice[] {
  return [
    ...linesOf(VOLTAGE_FEEDBACK_TABLE).map(voltageFeedback),
    ...linesOf(CURRENT_FEEDBACK_TABLE).map(currentFeedback),
    ...linesOf(MATCHED_BLOCK_TABLE).map(matchedBlock),
  ];
}

/** Price steps of a usual quote against the price at 250 pieces. */
const USUAL_STEPS: readonly (readonly [quantity: number, factor: number])[] = [
  [1, 2.1],
  [10, 1.75],
  [100, 1.3],
  [250, 1],
  [1000, 0.88],
];

/** Breaks in millionths of a dollar, in whole cents; those of the quote itself where they are given. */
export function priceBreaks(
  price: number,
  given?: readonly (readonly [quantity: number, usd: number])[],
): { quantity: number; unitPriceMicros: number }[] {
  const table = given ?? USUAL_STEPS.map(([quantity, factor]) => [quantity, price * factor] as const);
  return table.map(([quantity, usd]) => ({ quantity, unitPriceMicros: Math.round(usd * 100) * 10_000 }));
}
