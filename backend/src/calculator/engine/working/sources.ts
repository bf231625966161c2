/** Published sources that workings name. Sections are given from memory where the edition is not at hand. */
export const CLOSED_LOOP_SOURCE =
  'A. S. Sedra, K. C. Smith, Microelectronic Circuits, 6th ed., ch. 2: bandwidth of inverting and non-inverting amplifiers (from memory)';
export const FEEDBACK_SOURCE =
  'S. Franco, Design with Operational Amplifiers and Analog Integrated Circuits, chapters on static and dynamic limitations (from memory)';
export const STABILITY_SOURCE =
  'P. R. Gray, R. G. Meyer, Analysis and Design of Analog Integrated Circuits, chapter on frequency response and stability of feedback amplifiers (from memory)';
export const NETWORK_SOURCE =
  'C. A. Desoer, E. S. Kuh, Basic Circuit Theory (1969): Thévenin equivalents and network functions (from memory)';
export const CASCADE_SOURCE =
  'J. Millman, C. Halkias, Integrated Electronics, chapter on multistage amplifiers (from memory)';
export const RISE_TIME_SOURCE =
  'H. Johnson, M. Graham, High-Speed Digital Design (1993): rise time and −3 dB frequency of one pole (from memory)';
export const SLEW_SOURCE =
  'A. S. Sedra, K. C. Smith, Microelectronic Circuits, 6th ed., ch. 2: slew rate and full-power bandwidth (from memory)';
export const NOISE_SOURCE =
  'H. Nyquist, Phys. Rev. 32 (1928), p. 110; amplifier noise model as in Franco, chapter on noise (from memory)';
export const NOISE_FIGURE_SOURCE = 'D. M. Pozar, Microwave Engineering, 4th ed., ch. 10: noise figure (from memory)';
export const CURRENT_FEEDBACK_SOURCE =
  'TI datasheet SBOS354A (2008), loop gain of a current-feedback amplifier, eqs. 6 and 7';
export const COMMON_PRACTICE = 'common practice';

/** Limits of validity that many figures share. */
export const SMALL_SIGNAL = 'Small signal: no slewing, no clipping, no compression.';
export const LINEAR_NETWORK =
  'Linear network of the parts that are set; board parasitics are in it only where they are entered.';
export const DATASHEET_CONDITIONS = 'Datasheet values hold at their test conditions, supply and temperature.';
