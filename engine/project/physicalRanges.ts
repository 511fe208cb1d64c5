import { WATER_UNIT_WEIGHT } from '../units.ts';
import { aboveUpTo, betweenBoth, fromTo } from './numberRange.ts';

/**
 * What each number of a project may be, in the unit of its key. Lower ends are those of physics; upper ends
 * lie well beyond anything found in the ground and catch a wrong unit or a slip (common practice).
 */
export const PHYSICAL = {
  soilUnitWeight: fromTo(WATER_UNIT_WEIGHT, 40),
  fillUnitWeight: aboveUpTo(0, 40),
  /** Cc, Cr, Cs: change of void ratio over a tenfold stress. */
  index: aboveUpTo(0, 20),
  /** Ck: change of void ratio over a tenfold permeability; far below that of any soil k would vanish. */
  permeabilityIndex: fromTo(0.05, 20),
  /** Cr/Cc and Cs/Cc; the part above 1 is set to 1 and counted. */
  indexRatio: aboveUpTo(0, 5),
  voidRatio: aboveUpTo(0, 30),
  /** The part below 1 is raised to 1 and counted. */
  overconsolidationRatio: aboveUpTo(0, 100),
  /** The part below 0 is raised to 0 and counted. */
  preOverburden: fromTo(-1_000, 10_000),
  preconsolidation: aboveUpTo(0, 100_000),
  consolidation: aboveUpTo(0, 100_000),
  permeability: aboveUpTo(0, 1),
  horizontalRatio: aboveUpTo(0, 100),
  preYieldFactor: aboveUpTo(0, 1_000),
  secondaryIndex: fromTo(0, 5),
  secondaryRatio: fromTo(0, 1),
  modulus: aboveUpTo(0, 1e9),
  layerThickness: aboveUpTo(0, 500),
  thicknessAtBoring: fromTo(0, 500),
  thicknessFactor: aboveUpTo(0, 10),
  depth: fromTo(0, 1_000),
  waterDepth: fromTo(-100, 500),
  excessHead: fromTo(-500, 500),
  position: fromTo(-100_000, 100_000),
  crestWidth: fromTo(0, 10_000),
  slope: fromTo(0, 100),
  liftThickness: aboveUpTo(0, 100),
  pressure: fromTo(0, 10_000),
  /** The air's own pressure is the most that a vacuum can take away. */
  vacuum: aboveUpTo(0, 101.325),
  year: fromTo(-10_000, 10_000),
  drainSpacing: aboveUpTo(0, 50),
  drainDiameter: aboveUpTo(0, 5),
  bandSize: aboveUpTo(0, 1_000),
  smearRatio: fromTo(1, 1_000),
  permeabilityRatio: fromTo(1, 1_000),
  dischargeCapacity: aboveUpTo(0, 1e7),
  modelFactor: aboveUpTo(0, 100),
  share: fromTo(0, 1),
  reductionExponent: fromTo(0, 100),
  scaleOfFluctuation: aboveUpTo(0, 1e6),
  varianceShare: aboveUpTo(0, 1),
  limitMillimetres: fromTo(0, 100_000),
  limitSlope: fromTo(0, 10),
  limitRate: fromTo(0, 1e6),
} as const;

/**
 * What the central value (the median) of some numbers may be, where single realisations may go beyond: those
 * are set back and counted.
 */
export const CENTRAL = {
  indexRatio: betweenBoth(0, 1),
  overconsolidationRatio: fromTo(1, 100),
  preOverburden: fromTo(0, 10_000),
  /** 1, but for what rounding does. */
  thicknessFactor: fromTo(1 - 1e-6, 1 + 1e-6),
} as const;

/** How many of each a project may hold. */
export const MOST = {
  soils: 50,
  layers: 50,
  lifts: 50,
  surfaceLoads: 50,
  points: 200,
  pairs: 500,
  borings: 200,
  outputTimes: 500,
  limits: 200,
  correlations: 2_000,
  tableRows: 1_000,
  percentiles: 25,
  realisations: 1_000_000,
  nameLength: 100,
  textLength: 100_000,
} as const;
