/** Cases of the collection that no figure of the calculator answers yet, with what they wait for. */
export interface CaseLeft {
  readonly ids: readonly string[];
  readonly what: string;
  readonly why: string;
}

export const CASES_LEFT: readonly CaseLeft[] = [
  { ids: ['B08'], what: 'slew rate from a measured step', why: 'a bench value: measured figures beside the budget' },
  {
    ids: ['C08'],
    what: 'the approximation 0.833/√n',
    why: 'an approximation that is not used; C02 holds the exact one',
  },
  {
    ids: ['D06'],
    what: 'overshoot of a two-pole loop by phase margin',
    why: 'no figure in the time domain; D10 holds the peaking of the same loops',
  },
  { ids: ['G10'], what: 'noise bandwidth of Butterworth filters', why: 'filter prototypes' },
  {
    ids: ['H02', 'H12', 'I01', 'I06'],
    what: 'noise floor, sensitivity, antenna temperature',
    why: 'receiver figures: noise integrated over the band',
  },
  {
    ids: ['I07', 'I08', 'I14', 'I15'],
    what: 'intercept points and dynamic range',
    why: 'receiver figures: intermodulation',
  },
  { ids: ['J02', 'J03', 'J05'], what: 'fT and Miller capacitance', why: 'transistor stages' },
  {
    ids: ['K01', 'P05'],
    what: 'self-resonance of capacitors and inductors',
    why: 'layout: parasitics of passive parts',
  },
  {
    ids: ['L01', 'L02', 'L03', 'L04', 'L05', 'L06', 'L07', 'L08', 'P01', 'P02', 'P03', 'P06'],
    what: 'wavelength, bands, microstrip, where RF practice starts',
    why: 'layout: electrical size',
  },
  { ids: ['N01', 'N03', 'N04', 'N06'], what: 'tolerances and the normal distribution', why: 'spread study' },
];
