import type { Beta } from './beta.ts';
import { lowModeHighFault } from './triangular.ts';

/** PERT distribution: the beta distribution between low and high that low, best and high give. */
export interface Pert {
  readonly kind: 'pert';
  readonly low: number;
  readonly mode: number;
  readonly high: number;
}

export function makePert(input: {
  readonly low: number;
  readonly mode: number;
  readonly high: number;
}): Pert | string {
  const { low, mode, high } = input;
  return lowModeHighFault(low, mode, high) ?? { kind: 'pert', low, mode, high };
}

/** Its shapes: 1 + 4 (mode − low)/(high − low) and 1 + 4 (high − mode)/(high − low) (Malcolm et al. 1959). */
export function betaOfPert({ low, mode, high }: Pert): Beta {
  const width = high - low;
  return {
    kind: 'beta',
    low,
    high,
    alpha: 1 + (4 * (mode - low)) / width,
    beta: 1 + (4 * (high - mode)) / width,
  };
}
