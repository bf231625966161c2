/**
 * Amplitude ratio (> 0) in dB.
 *
 * @example ratioToDb(10) // 20
 */
export function ratioToDb(ratio: number): number {
  return 20 * Math.log10(ratio);
}

/**
 * Power ratio (> 0) in dB.
 *
 * @example powerToDb(2) // 3.0103
 */
export function powerToDb(power: number): number {
  return 10 * Math.log10(power);
}

/**
 * dB to an amplitude ratio.
 *
 * @example dbToRatio(20) // 10
 */
export function dbToRatio(db: number): number {
  return 10 ** (db / 20);
}

/**
 * dB to a power ratio.
 *
 * @example dbToPower(3.0103) // 2
 */
export function dbToPower(db: number): number {
  return 10 ** (db / 10);
}

/**
 * Peak EMF in V of a source that has `dbm` of power available behind `resistanceOhm`: P = Erms²/(4·Rs), Epk = √2·Erms.
 * Source: definition of available power.
 *
 * @example availablePowerToPeakEmf(0, 50) // 0.6325 (0.2236 V rms into a matched load, twice that as EMF, × √2)
 */
export function availablePowerToPeakEmf(dbm: number, resistanceOhm: number): number {
  const powerW = 1e-3 * dbToPower(dbm);
  return Math.SQRT2 * Math.sqrt(4 * resistanceOhm * powerW);
}

/**
 * Radians in degrees.
 *
 * @example degrees(Math.PI) // 180
 */
export function degrees(radians: number): number {
  return (radians * 180) / Math.PI;
}
