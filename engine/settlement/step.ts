import { ln } from '../elementary.ts';
import {
  compressibilityAt,
  firstLoadingStrain,
  STRAIGHT_BELOW,
  swelledStrain,
  type CompressionLaw,
} from '../ground/compressionLaw.ts';
import type { Column } from './column.ts';
import type { ColumnState } from './columnState.ts';
import { emptyFlow, flowCoefficients, type Flow } from './flow.ts';
import type { TotalStress } from './stressState.ts';
import { eliminate } from './eliminate.ts';

/** Arrays that a step works in. */
export interface StepScratch {
  /** m_v, 1/kPa */
  readonly compressibility: Float64Array;
  readonly offDiagonal: Float64Array;
  readonly diagonal: Float64Array;
  /** Right side, then the change of u that it gives, kPa. */
  readonly rest: Float64Array;
  /** The same for 1 m more of settlement. */
  readonly perMetre: Float64Array;
  readonly flow: Flow;
  readonly memory: SwellingMemory;
  /** Whether σ' changed so little in the last iteration that permeability need not follow. */
  flowKept: boolean;
  closed: boolean;
}

/** Where each cell's swelling line starts, as far as it has been asked for. */
interface SwellingMemory {
  readonly largest: Float64Array;
  readonly strain: Float64Array;
  readonly logarithm: Float64Array;
}

export function stepScratch(cells: number): StepScratch {
  const array = () => new Float64Array(cells);
  return {
    compressibility: array(),
    offDiagonal: array(),
    diagonal: array(),
    rest: array(),
    perMetre: array(),
    flow: emptyFlow(cells),
    memory: { largest: array(), strain: array(), logarithm: array() },
    flowKept: false,
    closed: false,
  };
}

/** A step has closed when σ' changes by less than this share of itself and this share of the load. */
const CLOSED_OF_STRESS = 3e-2;
const CLOSED_OF_LOAD = 2e-2;
/** Smallest load by which the iteration is judged, kPa. */
const LEAST_LOAD = 0.2;
/** Permeability follows the iterate while σ' changes by more than this share of itself. */
const FLOW_KEPT = 0.05;
const MOST_ITERATIONS = 40;
/** Share of its σ' that a cell may lose in one iteration. */
const LARGEST_FALL = 0.7;

/**
 * One implicit step of the consolidation equation in material coordinates (method statement, section 4). In
 * each cell the strain is the water that has left it,
 *
 *     h (ε(σ') − ε_before) = Δt · out(u),   σ' = base + slope·s − u,   s = F (Σ h ε + secondary),
 *
 * solved by Newton's method for u and s together: s couples all cells, so that each iteration solves one
 * tridiagonal system for two right sides. Permeability follows the iterate while that changes much. The
 * first iterate is a prediction of the end of the step. The strain that is kept satisfies the balance itself,
 * so that no water is lost whatever the tolerance of the iteration.
 *
 * @param total total stress at the end of the step
 * @param before strain to which the step adds, of each cell
 * @param duration Δt, years; with 0 a load acts at once and nothing drains
 * @param state holds the first iterate of σ' on entry; changed in place, except for what `endStep` does
 * @returns whether the iteration closed
 */
export function solveStep(
  column: Column,
  total: TotalStress,
  before: Float64Array,
  duration: number,
  state: ColumnState,
  scratch: StepScratch,
): boolean {
  setGivenPressures(column, total, state);
  scratch.flowKept = false;
  scratch.closed = false;
  for (let iteration = 0; !scratch.closed && iteration < MOST_ITERATIONS; iteration += 1) {
    applyLaw(column, total, state, scratch);
    if (!scratch.flowKept) flowCoefficients(column, state, total.drained, scratch.flow);
    assemble(column, total, before, duration, state, scratch);
    eliminate(scratch.offDiagonal, scratch.diagonal, scratch.rest, total.coupled ? scratch.perMetre : null);
    improve(column, total, state, scratch);
  }
  return scratch.closed;
}

/** Takes over a solved step: the memory of the largest σ', and the settlement. */
export function endStep(column: Column, state: ColumnState): void {
  const { stress, largest, strain } = state;
  const { thickness } = column.cells;
  let settled = state.secondary;
  for (let i = 0; i < stress.length; i += 1) {
    if (stress[i] > largest[i]) largest[i] = stress[i];
    else if (stress[i] < STRAIGHT_BELOW) state.swelledStraight = true;
    settled += thickness[i] * strain[i];
  }
  state.settlement = column.settlementFactor * settled;
}

/** u, ε and m_v of the iterate's σ': `strainAt` and `compressibilityAt`, written out. */
function applyLaw(column: Column, total: TotalStress, state: ColumnState, scratch: StepScratch): void {
  const { law } = column;
  const { initialStress, yieldStress, logInitial, logYield, strainAtYield } = law;
  const { compression, recompression, modulus } = law;
  const { pore, stress, largest, strain, settlement } = state;
  const { base, slope } = total;
  const { compressibility, memory } = scratch;
  for (let i = 0; i < pore.length; i += 1) {
    const sigma = stress[i];
    pore[i] = base[i] + slope[i] * settlement - sigma;
    if (modulus[i] > 0) {
      strain[i] = (sigma - initialStress[i]) / modulus[i];
      compressibility[i] = 1 / modulus[i];
    } else if (sigma < largest[i]) {
      if (memory.largest[i] !== largest[i]) remember(law, i, largest[i], memory);
      strain[i] = swelledStrain(law, i, sigma, memory.strain[i], memory.logarithm[i]);
      compressibility[i] = compressibilityAt(law, i, sigma, largest[i]);
    } else if (sigma < yieldStress[i]) {
      strain[i] = recompression[i] * (ln(sigma) - logInitial[i]);
      compressibility[i] = recompression[i] / sigma;
    } else {
      strain[i] = strainAtYield[i] + compression[i] * (ln(sigma) - logYield[i]);
      compressibility[i] = compression[i] / sigma;
    }
  }
}

/** Notes the strain and the logarithm of a cell's largest σ', from which it swells. */
function remember(law: CompressionLaw, cell: number, largest: number, memory: SwellingMemory): void {
  memory.largest[cell] = largest;
  memory.strain[cell] = firstLoadingStrain(law, cell, largest);
  memory.logarithm[cell] = ln(largest);
}

/** σ' of the free-draining cells, whose excess pore pressure is given. */
function setGivenPressures(column: Column, total: TotalStress, state: ColumnState): void {
  const { free, joinedToTop } = column;
  for (let i = 0; i < free.length; i += 1) {
    if (free[i] === 0) continue;
    const given = joinedToTop[i] === 1 ? -total.vacuum : 0;
    state.stress[i] = total.base[i] + total.slope[i] * state.settlement - given;
  }
}

/**
 * Rows of the tridiagonal system for the change of u:
 * (h m_v + Δt Σc) δu_i − Δt c δu_(i±1) = h (ε − ε_before) − Δt out(u), and h m_v slope for 1 m more of settlement.
 */
function assemble(
  column: Column,
  total: TotalStress,
  before: Float64Array,
  duration: number,
  state: ColumnState,
  scratch: StepScratch,
): void {
  const { free } = column;
  const { thickness } = column.cells;
  const { pore, strain } = state;
  const { slope } = total;
  const { compressibility, offDiagonal, diagonal, rest, perMetre } = scratch;
  const { between, radial } = scratch.flow;
  const cells = pore.length;
  const outside = -total.vacuum;
  let above = outside;
  for (let i = 0; i < cells; i += 1) {
    if (free[i] === 1) {
      offDiagonal[i] = 0;
      diagonal[i] = 1;
      rest[i] = 0;
      perMetre[i] = 0;
    } else {
      const here = pore[i];
      const below = i === cells - 1 ? 0 : pore[i + 1];
      const up = between[i];
      const down = between[i + 1];
      const aside = radial[i];
      const out = up * (here - above) + down * (here - below) + aside * (here - outside);
      offDiagonal[i] = i > 0 && free[i - 1] === 0 ? -duration * up : 0;
      const softness = thickness[i] * compressibility[i];
      diagonal[i] = softness + duration * (up + down + aside);
      rest[i] = thickness[i] * (strain[i] - before[i]) - duration * out;
      perMetre[i] = softness * slope[i];
    }
    above = pore[i];
  }
}

/** Takes the step of the iteration and notes how much σ' changed. */
function improve(column: Column, total: TotalStress, state: ColumnState, scratch: StepScratch): void {
  const { stress, strain } = state;
  const { slope } = total;
  const { compressibility, rest, perMetre } = scratch;
  const { thickness } = column.cells;
  const cells = stress.length;
  let sunk = 0;
  if (total.coupled) {
    let settled = state.secondary;
    let direct = 0;
    let back = 0;
    for (let i = 0; i < cells; i += 1) {
      settled += thickness[i] * strain[i];
      const softness = thickness[i] * compressibility[i];
      direct -= softness * rest[i];
      back += softness * (slope[i] - perMetre[i]);
    }
    const factor = column.settlementFactor;
    sunk = (factor * (settled + direct) - state.settlement) / (1 - factor * back);
    state.settlement += sunk;
  }
  const closedChange = CLOSED_OF_LOAD * Math.max(total.largestLoad, LEAST_LOAD);
  let closed = true;
  let flowKept = true;
  for (let i = 0; i < cells; i += 1) {
    const was = stress[i];
    const scale = Math.max(was, STRAIGHT_BELOW);
    const change = Math.max(sunk * (slope[i] - perMetre[i]) - rest[i], -LARGEST_FALL * scale);
    const size = Math.abs(change);
    if (size > closedChange || size > CLOSED_OF_STRESS * scale) closed = false;
    if (size > FLOW_KEPT * scale) flowKept = false;
    stress[i] = was + change;
    strain[i] += compressibility[i] * change;
  }
  scratch.flowKept = flowKept;
  scratch.closed = closed;
}
