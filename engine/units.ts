/** γw, kN/m³ */
export const WATER_UNIT_WEIGHT = 9.81;
export const DAYS_PER_YEAR = 365.25;
const SECONDS_PER_YEAR = 86_400 * DAYS_PER_YEAR;

/** m/s to m/year */
export function metresPerYear(metresPerSecond: number): number {
  return metresPerSecond * SECONDS_PER_YEAR;
}
