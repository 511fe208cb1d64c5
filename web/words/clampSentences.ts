import { numberText } from './numberText.ts';

/** How often each happened, by the names of the engine's counts. */
type Counts = Readonly<Record<keyof typeof SENTENCES, number>>;

/** One sentence for everything that physics made the engine clamp or leave its law, with how often; none for what never happened. */
export function clampSentences(counts: Counts, realisations: number): string[] {
  const kinds = Object.keys(SENTENCES) as (keyof Counts)[];
  return kinds
    .filter((kind) => counts[kind] > 0)
    .map((kind) => {
      const count = numberText(counts[kind]);
      const often = COUNTED_OTHERWISE[kind] ?? `of ${numberText(realisations)} realisations`;
      return `${SENTENCES[kind]}: in ${count} ${often}.`;
    });
}

/** Each count of the engine has its sentence; a caller's type check asks for one when a count is added. */
const SENTENCES = {
  preconsolidationRaised: 'σ′_p lay below σ′_v0 in a cell and was raised to it',
  recompressionSetToCompression: 'C_r was drawn above C_c and set equal to it',
  cutAtLimits: 'Drawn values were cut at the limits of their marginals',
  voidRatioBelowTenth: 'A void ratio fell below 0.1, outside the compression law',
  strainAboveThirtyPercent: 'A strain passed 30 %',
  initialStressAtFloor: 'σ′_v0 was held at 1 kPa',
  vacuumDrainsCrossSeam: 'Drains under vacuum crossed a free-draining layer',
  datesPutInOrder: 'Dates were drawn out of order and set equal',
  smearReachesInfluence: 'The smear zone was as wide as the cylinder that its drain serves',
  effectiveStressVanished:
    'The effective stress of a cell fell below 1 kPa, where swelling is taken straight',
  stepsNotClosed: 'The iteration of the march did not close',
};

const COUNTED_OTHERWISE: Readonly<Partial<Record<keyof Counts, string>>> = {
  cutAtLimits: 'values',
  stepsNotClosed: 'steps',
};
