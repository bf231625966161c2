/** Boltzmann constant, J/K. Source: SI Brochure, 9th ed. (2019), section 2.2: exact. */
export const BOLTZMANN_J_PER_K = 1.380649e-23;

/**
 * Reference temperature of the noise figure, K.
 * Source: IRE Standards on Methods of Measuring Noise in Linear Twoports, Proc. IRE 48 (1960), p. 60 ff. (from memory).
 */
export const REFERENCE_TEMPERATURE_K = 290;

/** Ambient temperature of the resistors where a specification gives none, K (25 °C). Common practice. */
export const DEFAULT_AMBIENT_K = 298.15;

/** DC open-loop gain of a voltage-feedback amplifier whose datasheet is silent, dB; always marked assumed. */
export const ASSUMED_OPEN_LOOP_GAIN_DB = 120;

/** DC open-loop transimpedance of a current-feedback amplifier whose datasheet is silent, Ω; always marked assumed. */
export const ASSUMED_OPEN_LOOP_TRANSIMPEDANCE_OHM = 1e6;

export const TWO_PI = 2 * Math.PI;

/** |H|² at a −3 dB corner, relative to the ideal gain: half power, i.e. 3.0103 dB. */
export const HALF_POWER = 0.5;
