/** Constants of the US Standard Atmosphere 1976. */
export const seaLevelK = 288.15
export const seaLevelKpa = 101.325
export const seaLevelKgM3 = 1.225
/** Standard gravity, m/s². */
export const gravity = 9.80665
/** Gas constant of air, J/(kg K): that of the kilomole over its mass. */
const airJPerKgK = 8314.32 / 28.9644
/** Fall of temperature, K/m. */
const lapseKPerM = 0.0065

/** g₀/(R·L): pressure goes with this power of temperature, density with one less. */
export const pressureExponent = gravity / (airJPerKgK * lapseKPerM)

/** Natural logarithm of T/T₀ at a geopotential height, m: by log1p, so that small heights keep their digits. */
export const logTemperatureRatio = (altitudeM: number): number => Math.log1p((-lapseKPerM * altitudeM) / seaLevelK)
/** The height at which it has a given value, m. */
export const altitudeOfLogTemperatureRatio = (logRatio: number): number => (-Math.expm1(logRatio) * seaLevelK) / lapseKPerM

export const standardTemperatureK = (altitudeM: number): number => seaLevelK - lapseKPerM * altitudeM
export const standardPressureKpa = (altitudeM: number): number => seaLevelKpa * Math.exp(pressureExponent * logTemperatureRatio(altitudeM))
/** Density over that at sea level at the standard temperature. */
export const standardDensityRatio = (altitudeM: number): number => Math.exp((pressureExponent - 1) * logTemperatureRatio(altitudeM))
