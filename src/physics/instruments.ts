/**
 * Error of an instrument of full-scale accuracy, relative to what it reads.
 *
 *     δ = a FS/x
 *
 * Range: x > 0 and at most the full scale.
 *
 * @param accuracy a: error as a fraction of full scale [1]
 * @param fullScale FS: full scale [any]
 * @param reading x: what the instrument reads, in the unit of the full scale [any]
 * @returns δ: relative error of the reading [1]
 * @source definition of full-scale accuracy; SEMI E56
 * @example fullScaleError(0.01, 100, 10) -> 0.10
 */
export function fullScaleError(accuracy: number, fullScale: number, reading: number): number {
  return (accuracy * fullScale) / reading;
}

/**
 * What a heated gauge reads over the pressure in the chamber, where molecules in its tube meet only walls.
 *
 *     p_gauge/p = sqrt(T_gauge/T)
 *
 * Range: Kn >> 1 in the gauge's tube. Weakness: real tubes fall short: 1.026 was measured where this gives 1.04.
 *
 * @param gaugeTemperature T_gauge: temperature of the gauge [K]
 * @param chamberTemperature T: temperature of the chamber [K]
 * @returns p_gauge/p: ratio of the pressures [1]
 * @source Knudsen, Ann. Phys. 336 (1), 205 (1910)
 * @example transpirationLimit(318.15, 293.15) -> 1.0418
 */
export function transpirationLimit(gaugeTemperature: number, chamberTemperature: number): number {
  return Math.sqrt(gaugeTemperature / chamberTemperature);
}

/**
 * What a heated gauge reads over the pressure in the chamber at any pressure, by Takaishi and Sensui.
 *
 *     p_gauge/p = (Y + 1)/(Y + sqrt(T/T_gauge)),  Y = A X² + B X + C sqrt(X),  X = 2 p_gauge d/(T_gauge + T)
 *
 * Range: tubes of 1 to 20 mm. Weakness: constants for He, Ne, Ar, Kr, N2, H2 only (that of Ne doubtful); their growth with the size of
 * the molecule is not physical.
 *
 * @param gaugePressure p_gauge: pressure in the gauge [Pa]
 * @param diameter d: inner diameter of the tube [m]
 * @param gaugeTemperature T_gauge: temperature of the gauge [K]
 * @param chamberTemperature T: temperature of the chamber [K]
 * @param a A: constant of the gas [K2/(Pa2 m2)]
 * @param b B: constant of the gas [K/(Pa m)]
 * @param c C: constant of the gas [K0.5/(Pa0.5 m0.5)]
 * @returns p_gauge/p: ratio of the pressures [1]
 * @source Takaishi & Sensui, Trans. Faraday Soc. 59, 2503 (1963)
 * @example transpiration(4, 0.0046, 318.15, 296.15, 6.0760e7, 6060.5, 42.724) -> 1.01875
 */
export function transpiration(
  gaugePressure: number,
  diameter: number,
  gaugeTemperature: number,
  chamberTemperature: number,
  a: number,
  b: number,
  c: number,
): number {
  const x = (2 * gaugePressure * diameter) / (gaugeTemperature + chamberTemperature);
  const y = a * x ** 2 + b * x + c * Math.sqrt(x);
  return (y + 1) / (y + Math.sqrt(chamberTemperature / gaugeTemperature));
}

/**
 * Flow of a gas over the flow that a thermal controller, calibrated for another gas, shows.
 *
 *     GCF = (C_p,ref/C_p)(s/s_ref)
 *
 * Range: thermal sensors, first order. Weakness: 4 %; makers' tables are measured and go before it.
 *
 * @param referenceHeatCapacity C_p,ref: molar heat capacity of the gas of the calibration [J/(mol K)]
 * @param heatCapacity C_p: molar heat capacity of the gas that flows [J/(mol K)]
 * @param referenceStructure s_ref: structure factor of the gas of the calibration [1]
 * @param structure s: structure factor, 1.03 for monatomic and 1.00 for diatomic gases [1]
 * @returns GCF: gas correction factor [1]
 * @source relation of thermal flow sensors, common practice; SEMI E77 is the method of test
 * @example gasCorrectionFactor(29.124, 20.786, 1, 1.03) -> 1.443
 */
export function gasCorrectionFactor(
  referenceHeatCapacity: number,
  heatCapacity: number,
  referenceStructure: number,
  structure: number,
): number {
  return (referenceHeatCapacity / heatCapacity) * (structure / referenceStructure);
}
