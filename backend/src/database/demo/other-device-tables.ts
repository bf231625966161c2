/**
 * Invented current-feedback amplifiers, one a line; "-" = the datasheet is silent. Columns:
 * part | package | channels | page | −3 dB bandwidth min typ, MHz | at noise gain | with feedback resistor, Ω |
 * inverting input resistance, Ω | open-loop transimpedance min typ, kΩ | slew min typ, V/µs | voltage noise, nV/√Hz |
 * current noise + input, − input, pA/√Hz | output resistance, Ω | input capacitance, pF | closest to the rails typ max, V |
 * output current min typ, mA | offset typ max, mV | bias + typ max, µA | bias − typ max, µA | supply min max, V |
 * quiescent current typ max, mA | USD each at 250
 */
export const CURRENT_FEEDBACK_TABLE = `
TLYR-C220  | SOIC-8   | 1 | 5 | 150 180  | 3 | 560 | 28 | 280 500  | - 900     | 2.4 | 2.2 17 | 6  | 1.5 | 1.1 1.4 | 60 90  | 1.5 5 | 2 8   | 4 15 | 8 12   | 9 -       | 1.95
TLYR-C90   | SOT-23-5 | 1 | 5 | 120 150  | 9 | 470 | 32 | 250 450  | 600 800   | 2.8 | 2 16   | 7  | 1.5 | 1.1 1.4 | 50 75  | 1.5 5 | 2 8   | 4 15 | 5 12   | 7.5 8.8   | 1.76
TLYR-C140  | SOT-23-5 | 1 | 5 | 110 140  | 3 | 680 | 35 | 240 420  | 420 560   | 3   | 2 15   | 8  | 1.5 | 1.1 1.4 | 40 60  | 2 6   | 2 8   | 5 18 | 5 12   | 5.2 6.1   | 1.18
TLYR-C300  | SOIC-8   | 1 | 5 | 240 300  | 3 | 470 | 24 | 300 520  | 1100 1400 | 2.2 | 2.5 18 | 5  | 1.3 | 1.2 1.5 | 60 90  | 1.5 5 | 3 10  | 5 18 | 8 12   | 11 12.8   | 2.4
TLYR-C450  | SOIC-8   | 1 | 6 | 350 450  | 3 | 390 | 20 | 260 480  | 1600 2000 | 2   | 2.8 20 | 5  | 1.2 | 1.2 1.5 | 70 100 | 2 6   | 4 12  | 6 20 | 8 12   | 14.5 16.8 | 2.95
TLYR-C700  | SOIC-8   | 1 | 6 | - 700    | 2 | 330 | 18 | - 420    | - 2600    | 1.9 | 3 22   | 4  | 1.1 | 1.2 1.5 | 70 100 | 2 6   | 5 14  | 7 24 | 8 12   | 18 21     | 3.6
TLYR-C180D | SOIC-8   | 2 | 5 | 135 180  | 3 | 620 | 30 | 260 460  | 650 850   | 2.6 | 2.2 17 | 7  | 1.5 | 1.1 1.4 | 50 75  | 2 6   | 2 8   | 5 18 | 8 12   | 7 8.2     | 3.1
TLYR-C60   | SOT-23-5 | 1 | 4 | 45 60    | 3 | 910 | 45 | 200 380  | 160 220   | 3.6 | 1.8 13 | 12 | 1.6 | 1 1.3   | 30 45  | 2 7   | 1.5 6 | 4 15 | 5 12   | 2.6 3.1   | 0.84
TLYR-C260L | SOT-23-5 | 1 | 5 | 200 260  | 3 | 510 | 26 | 260 460  | 500 680   | 2.5 | 2.4 17 | 6  | 1.3 | 1 1.3   | 50 70  | 2 6   | 3 10  | 5 18 | 4.5 5.5 | 6.8 7.9  | 1.64
TLYR-C320X | SOT-23-5 | 1 | 5 | - 320    | 3 | 430 | -  | - -      | - -       | -   | - -    | -  | -   | - -     | - -    | - -   | - -   | - -  | 5 12   | - -       | -
`;

/**
 * Invented matched blocks, one a line; "-" = the datasheet is silent. Columns:
 * part | package | grade | page | impedance, Ω | gain min typ, dB | lower corner, MHz | upper corner, MHz | noise figure typ max, dB |
 * output power at 1 dB compression, dBm | output intercept, dBm | supply min max, V | supply current typ max, mA | USD each at 250
 */
export const MATCHED_BLOCK_TABLE = `
TLYR-L430 | DFN-8    | rf              | 4 | 50 | 17.6 18.5   | 20  | 900   | 0.8 1.1 | 12  | 27 | 3 5    | 42 50 | 1.25
TLYR-B15  | SOT-89   | rf              | 3 | 50 | 13.8 14.5   | 10  | 2500  | 3.2 3.8 | 16  | 31 | 4.5 5.5 | 48 56 | 0.97
TLYR-B20  | SOT-89   | rf              | 3 | 50 | 19.2 20.1   | 10  | 1800  | 2.6 3.2 | 15  | 29 | 4.5 5.5 | 52 60 | 0.98
TLYR-B12P | SOT-89   | rf              | 3 | 50 | 11.2 12     | 5   | 1500  | 4.4 5.2 | 21  | 37 | 4.5 8  | 92 105 | 1.75
TLYR-B24  | SOT-343  | rf              | 4 | 50 | 23 24.2     | 30  | 1200  | 1.4 1.8 | 10  | 23 | 3 5    | 34 41 | 1.24
TLYR-L150 | DFN-8    | rf              | 4 | 50 | - 21        | 5   | 400   | 0.7 -   | -   | -  | 3 5    | 38 -  | 1.42
TLYR-A3   | 0805     | general-purpose | 2 | 50 | -3.2 -3     | -   | 6000  | - -     | -   | -  | - -    | - -   | 0.19
TLYR-A6   | 0805     | general-purpose | 2 | 50 | -6.3 -6     | -   | 6000  | - -     | -   | -  | - -    | - -   | 0.19
TLYR-A10  | 0805     | general-purpose | 2 | 50 | -10.4 -10   | -   | 6000  | - -     | -   | -  | - -    | - -   | 0.19
TLYR-A20  | 0805     | general-purpose | 2 | 50 | -20.6 -20   | -   | 5000  | - -     | -   | -  | - -    | - -   | 0.21
TLYR-K3   | cable    | general-purpose | 2 | 50 | -0.45 -0.35 | -   | 3000  | - -     | -   | -  | - -    | - -   | 2.6
`;
