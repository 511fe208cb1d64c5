import type { Model } from '../project/model.ts';
import type { Realisations } from '../settlement/realisations.ts';
import { rankedInput, rankedInputs, type RankedInput, type RankedInputs } from './drivers.ts';
import type { Quantity } from './summary.ts';

/**
 * The inputs as a quantity sees them: at its point. Of a pair, an input that varies from place to place has the
 * difference second minus first, as the result has; but where one point of the pair is fixed, the value at the
 * other alone, for the ground under a fixed point moves nothing. An input that does not vary from place to place
 * has its one value. Each is ranked once for each place.
 *
 * The difference does not see what an input does to both points alike: where one point settles much more than the
 * other, it understates the input.
 */
export function driverInputs(
  model: Model,
  pooled: readonly Realisations[],
): (quantity: Quantity) => RankedInputs {
  const everywhere = new Map<number, RankedInput>();
  const byPlace = new Map<string, RankedInputs>();
  return (quantity) => {
    const place = quantity.pair >= 0 ? `pair ${quantity.pair}` : `point ${quantity.point}`;
    const known = byPlace.get(place);
    if (known !== undefined) return known;
    const found = rankedInputs(
      model.inputs.map(({ spread }, input) => {
        if (spread !== null) return rankedInput(input, valuesAt(model, pooled, input, quantity));
        const ranked = everywhere.get(input) ?? rankedInput(input, columnAt(pooled, input, 0));
        everywhere.set(input, ranked);
        return ranked;
      }),
    );
    byPlace.set(place, found);
    return found;
  };
}

function valuesAt(
  model: Model,
  pooled: readonly Realisations[],
  input: number,
  { point, pair }: Quantity,
): Float64Array {
  if (pair < 0) return columnAt(pooled, input, point);
  const { first, second } = model.pairs[pair];
  if (model.points[first].fixed) return columnAt(pooled, input, second);
  const atFirst = columnAt(pooled, input, first);
  if (model.points[second].fixed) return atFirst;
  return columnAt(pooled, input, second).map((value, i) => value - atFirst[i]);
}

/** Drawn values of an input at a point, replicate after replicate; the one value where it is the same at all. */
function columnAt(pooled: readonly Realisations[], input: number, point: number): Float64Array {
  const values = new Float64Array(pooled.reduce((sum, { count }) => sum + count, 0));
  let offset = 0;
  for (const { inputs, count } of pooled) {
    const start = inputs[input].length > count ? point * count : 0;
    values.set(inputs[input].subarray(start, start + count), offset);
    offset += count;
  }
  return values;
}
