/** Unit weight of water γw, kN/m³. */
export const WATER_UNIT_WEIGHT = 9.81;
export const DAYS_PER_YEAR = 365.25;
export const SECONDS_PER_YEAR = 86_400 * DAYS_PER_YEAR;

/** A speed in m/s, such as a permeability, in m/year. */
export function metresPerYear(metresPerSecond: number): number {
  return metresPerSecond * SECONDS_PER_YEAR;
}

/** A length in m, such as a settlement, in mm. */
export function millimetres(metres: number): number {
  return metres * 1000;
}
