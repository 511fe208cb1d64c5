import type {
  Drains,
  Layer,
  Lift,
  Model,
  OutOfPlane,
  Period,
  SurfaceLoad,
} from '../../../engine/project/model.ts';
import type { Preconsolidation, Soil } from '../../../engine/project/soil.ts';
import type { UncertainNumber } from '../../../engine/project/uncertainNumber.ts';

/** A compressible soil of plain numbers; what is left out is 1 where it is a ratio and absent where it is an option. */
export interface PlainCompressible {
  readonly unitWeight?: number;
  readonly compressionIndex: number;
  readonly recompressionIndex: number;
  readonly swellingIndex?: number;
  readonly voidRatio: number;
  readonly ocr?: number;
  readonly pop?: number;
  /** Depth and σ'p at two depths. */
  readonly profile?: readonly [readonly [number, number], readonly [number, number]];
  /** m²/year; or else k0, m/s. */
  readonly cv?: number;
  readonly k0?: number;
  readonly permeabilityIndex?: number;
  readonly horizontalRatio?: number;
  readonly preYieldFactor?: number;
  readonly secondaryIndex?: number;
}

/** A stiff soil: free-draining unless it has a c_v. */
export interface PlainStiff {
  readonly unitWeight?: number;
  readonly modulus: number;
  readonly cv?: number;
  readonly horizontalRatio?: number;
}

export interface PlainLift extends Partial<Pick<Lift, 'crestCentre' | 'standing'>> {
  readonly crestWidth?: number;
  /** Of both sides. */
  readonly slope?: number;
  readonly thickness: number;
  readonly unitWeight?: number;
  readonly placing?: readonly [number, number];
  readonly removal?: readonly [number, number];
  readonly outOfPlane?: OutOfPlane;
}

export interface PlainLoad {
  readonly pressure: number;
  readonly x1?: number;
  readonly x2?: number;
  readonly start?: number;
  readonly end?: number;
  readonly outOfPlane?: OutOfPlane;
}

export interface PlainDrains extends Pick<Drains, 'spacing' | 'diameter'> {
  readonly pattern?: Drains['pattern'];
  readonly smearRatio?: number;
  readonly permeabilityRatio?: number;
  readonly dischargeCapacity?: number;
  readonly top?: number;
  readonly foot: number;
  readonly installed?: number;
}

export interface Plain {
  /** From the top down: thickness and soil. Layers of one soil name the same object. */
  readonly layers: readonly { readonly thickness: number; readonly soil: PlainCompressible | PlainStiff }[];
  readonly waterDepth?: number;
  readonly baseExcessHead?: number;
  readonly top?: 'drained' | 'closed';
  readonly base?: 'drained' | 'closed';
  readonly lifts?: readonly PlainLift[];
  readonly loads?: readonly PlainLoad[];
  readonly drains?: PlainDrains;
  readonly vacuum?: { readonly pressure: number; readonly start?: number; readonly end?: number };
  readonly heldUntil?: number;
  readonly topUpUnitWeight?: number;
  readonly submergence?: boolean;
  /** σz = q at all depths; true unless stated. */
  readonly wide?: boolean;
  readonly secondary?: boolean;
  /** One point at 0 unless stated. */
  readonly x?: readonly number[];
  readonly handover?: number;
  readonly horizon: number;
  readonly outputTimes?: readonly number[];
  readonly degree?: number;
  readonly settlementFactor?: number;
  readonly rateFactor?: number;
}

/** A checked model, invented, in which nothing is uncertain: engine units, but k0 in m/s as in the model. */
export function plainModel(plain: Plain): Model {
  const distinct = [...new Set(plain.layers.map((layer) => layer.soil))];
  return {
    name: 'invented',
    notes: '',
    digest: '0'.repeat(32),
    soils: distinct.map((soil, i) => soilOf(soil, `soil ${i}`)),
    layers: plain.layers.map(({ thickness, soil }, i): Layer => ({
      name: `layer ${i}`,
      soil: distinct.indexOf(soil),
      thickness: { kind: 'even', thickness: fixed(thickness) },
    })),
    water: { depth: fixed(plain.waterDepth ?? 0), baseExcessHead: fixed(plain.baseExcessHead ?? 0) },
    boundaries: { top: plain.top ?? 'drained', base: plain.base ?? 'drained' },
    lifts: (plain.lifts ?? []).map(liftOf),
    surfaceLoads: (plain.loads ?? []).map(loadOf),
    drains: plain.drains === undefined ? null : drainsOf(plain.drains),
    vacuum:
      plain.vacuum === undefined
        ? null
        : {
            pressure: fixed(plain.vacuum.pressure),
            start: fixed(plain.vacuum.start ?? 0),
            end: fixed(plain.vacuum.end ?? 2 * plain.horizon),
          },
    couplings: {
      heldUntil: plain.heldUntil ?? null,
      topUpUnitWeight: plain.topUpUnitWeight === undefined ? null : fixed(plain.topUpUnitWeight),
      submergence: plain.submergence ?? false,
    },
    wideFill: plain.wide ?? true,
    secondary: { included: plain.secondary ?? false, reductionFloor: 0.1, reductionExponent: 6 },
    points: (plain.x ?? [0]).map((x, i) => ({ name: `point ${i}`, x, fixed: false })),
    pairs: [],
    handover: plain.handover ?? 0,
    horizon: plain.horizon,
    outputTimes: plain.outputTimes ?? [],
    limits: [],
    modelFactors: { settlement: fixed(plain.settlementFactor ?? 1), rate: fixed(plain.rateFactor ?? 1) },
    sampling: { realisations: 100, seed: 1 },
    results: { percentiles: [50], degreeOfConsolidation: plain.degree ?? null },
    inputs: [],
    correlations: [],
    remarks: [],
  };
}

export function fixed(value: number): UncertainNumber {
  return {
    name: 'fixed',
    label: '',
    unit: '1',
    marginal: { kind: 'fixed', value },
    index: -1,
    spread: null,
    keepsMean: false,
    source: { kind: 'not stated', text: '' },
    note: '',
  };
}

const UNIT_WEIGHT = 18;

function soilOf(soil: PlainCompressible | PlainStiff, name: string): Soil {
  const unitWeight = fixed(soil.unitWeight ?? UNIT_WEIGHT);
  if (!('modulus' in soil)) return compressibleOf(soil, name);
  const modulus = fixed(soil.modulus);
  if (soil.cv === undefined) return { behaviour: 'stiff_free_draining', name, unitWeight, modulus };
  return {
    behaviour: 'stiff_poorly_draining',
    name,
    unitWeight,
    modulus,
    verticalCoefficient: fixed(soil.cv),
    horizontalRatio: fixed(soil.horizontalRatio ?? 1),
  };
}

function compressibleOf(soil: PlainCompressible, name: string): Soil {
  const option = (value: number | undefined) => (value === undefined ? null : fixed(value));
  const index = (value: number) => ({ given: 'index' as const, number: fixed(value) });
  const permeabilityIndex = option(soil.permeabilityIndex);
  return {
    behaviour: 'compressible',
    name,
    unitWeight: fixed(soil.unitWeight ?? UNIT_WEIGHT),
    compressionIndex: fixed(soil.compressionIndex),
    recompression: index(soil.recompressionIndex),
    swelling: soil.swellingIndex === undefined ? null : index(soil.swellingIndex),
    initialVoidRatio: fixed(soil.voidRatio),
    preconsolidation: preconsolidationOf(soil),
    permeability:
      soil.k0 === undefined
        ? { kind: 'cv', verticalCoefficient: fixed(soil.cv ?? 1), permeabilityIndex }
        : { kind: 'k0', permeability: fixed(soil.k0), permeabilityIndex },
    horizontalRatio: fixed(soil.horizontalRatio ?? 1),
    preYieldFactor: fixed(soil.preYieldFactor ?? 1),
    secondary: soil.secondaryIndex === undefined ? null : index(soil.secondaryIndex),
  };
}

function preconsolidationOf({ pop, profile, ocr }: PlainCompressible): Preconsolidation {
  if (pop !== undefined) return { kind: 'pop', pop: fixed(pop) };
  if (profile === undefined) return { kind: 'ocr', ocr: fixed(ocr ?? 1) };
  const at = ([depth, stress]: readonly [number, number]) => ({ depth, stress: fixed(stress) });
  return { kind: 'profile', upper: at(profile[0]), lower: at(profile[1]) };
}

const ENDLESS: OutOfPlane = { from: -Infinity, to: Infinity };

function periodOf(period: readonly [number, number] | undefined): Period | null {
  return period === undefined ? null : { start: fixed(period[0]), end: fixed(period[1]) };
}

function liftOf(lift: PlainLift, i: number): Lift {
  const standing = lift.standing ?? false;
  return {
    name: `lift ${i}`,
    crestCentre: lift.crestCentre ?? 0,
    crestWidth: lift.crestWidth ?? 20,
    leftSlope: lift.slope ?? 2,
    rightSlope: lift.slope ?? 2,
    thickness: fixed(lift.thickness),
    unitWeight: fixed(lift.unitWeight ?? 20),
    standing,
    placing: standing ? null : periodOf(lift.placing ?? [0, 0]),
    removal: periodOf(lift.removal),
    outOfPlane: lift.outOfPlane ?? ENDLESS,
  };
}

function loadOf(load: PlainLoad, i: number): SurfaceLoad {
  return {
    name: `load ${i}`,
    traffic: false,
    pressure: fixed(load.pressure),
    x1: load.x1 ?? -50,
    x2: load.x2 ?? 50,
    outOfPlane: load.outOfPlane ?? ENDLESS,
    start: fixed(load.start ?? 0),
    end: load.end === undefined ? null : fixed(load.end),
  };
}

function drainsOf(drains: PlainDrains): Drains {
  return {
    pattern: drains.pattern ?? 'triangular',
    spacing: drains.spacing,
    diameter: drains.diameter,
    smearRatio: fixed(drains.smearRatio ?? 1),
    permeabilityRatio: fixed(drains.permeabilityRatio ?? 1),
    dischargeCapacity: drains.dischargeCapacity === undefined ? null : fixed(drains.dischargeCapacity),
    top: drains.top ?? 0,
    foot: drains.foot,
    installed: drains.installed ?? 0,
    from: -Infinity,
    to: Infinity,
  };
}
