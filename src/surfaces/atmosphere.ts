/** Pressure of the standard atmosphere (ISO 2533:1975) below 11 km, Pa, from the altitude in metres. */
export function standardPressure(altitude: number): number {
  const seaLevelPressure = 101325;
  const seaLevelTemperature = 288.15;
  const lapse = 0.0065;
  const gasConstant = 287.05287;
  const gravity = 9.80665;
  return seaLevelPressure * (1 - (lapse * altitude) / seaLevelTemperature) ** (gravity / (gasConstant * lapse));
}
