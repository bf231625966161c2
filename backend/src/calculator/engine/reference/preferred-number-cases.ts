import type { PublishedCase } from './published-case';

const IEC = 'IEC 60063:2015, preferred number series for resistors and capacitors';

/** Preferred numbers. */
export const PREFERRED_NUMBER_CASES: readonly PublishedCase[] = [
  {
    id: 'M01',
    what: 'E24: the list, and how many of its values differ from the rounded geometric series',
    inputs: { list: [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91] },
    expected: { count: 24, departures: 8 },
    tolerance: { count: 0, departures: 0 },
    source: IEC,
    provenance: 'read in the source',
  },
  {
    id: 'M02',
    what: 'E96: the list',
    inputs: {
      list: [
        100, 102, 105, 107, 110, 113, 115, 118, 121, 124, 127, 130, 133, 137, 140, 143, 147, 150, 154, 158, 162, 165,
        169, 174, 178, 182, 187, 191, 196, 200, 205, 210, 215, 221, 226, 232, 237, 243, 249, 255, 261, 267, 274, 280,
        287, 294, 301, 309, 316, 324, 332, 340, 348, 357, 365, 374, 383, 392, 402, 412, 422, 432, 442, 453, 464, 475,
        487, 499, 511, 523, 536, 549, 562, 576, 590, 604, 619, 634, 649, 665, 681, 698, 715, 732, 750, 768, 787, 806,
        825, 845, 866, 887, 909, 931, 953, 976,
      ],
    },
    expected: { count: 96 },
    tolerance: { count: 0 },
    source: IEC,
    provenance: 'read in the source',
    note: '83 of the values were read in the source, the others follow from the geometric series.',
  },
  {
    id: 'M03',
    what: 'E48: the list, every second value of E96',
    inputs: {
      list: [
        100, 105, 110, 115, 121, 127, 133, 140, 147, 154, 162, 169, 178, 187, 196, 205, 215, 226, 237, 249, 261, 274,
        287, 301, 316, 332, 348, 365, 383, 402, 422, 442, 464, 487, 511, 536, 562, 590, 619, 649, 681, 715, 750, 787,
        825, 866, 909, 953,
      ],
    },
    expected: { count: 48 },
    tolerance: { count: 0 },
    source: IEC,
    provenance: 'read in the source',
  },
  {
    id: 'M04',
    what: 'customary tolerance of a series, in %',
    inputs: {},
    expected: { E6: 20, E12: 10, E24: 5, E48: 2, E96: 1, E192: 0.5 },
    tolerance: { E6: 0, E12: 0, E24: 0, E48: 0, E96: 0, E192: 0 },
    source: 'common practice',
    provenance: 'common practice',
  },
  {
    id: 'M05',
    what: 'nearest value by logarithmic distance',
    inputs: {},
    expected: { 'E96 599': 604, 'E96 1234': 1240, 'E24 5000': 5100, 'E96 5000': 4990, 'E24 4321': 4300 },
    tolerance: { 'E96 599': 1e-6, 'E96 1234': 1e-6, 'E24 5000': 1e-6, 'E96 5000': 1e-6, 'E24 4321': 1e-6 },
    source: IEC,
    provenance: 'derived from the definition',
  },
  {
    id: 'M07',
    what: 'two E24 resistors in parallel for 1,234 Ω (1 kΩ to 9.1 kΩ with 1 kΩ to 910 kΩ): smallest error in %',
    inputs: { targetOhm: 1234 },
    expected: { errorPercent: 0.0647 },
    tolerance: { errorPercent: 5e-5 },
    source: `${IEC}, exhaustive search`,
    provenance: 'derived from the definition',
  },
];
