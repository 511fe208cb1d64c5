/** Realisations in a replicate: the strata of its Latin hypercube. */
export const REALISATIONS_IN_REPLICATE = 100;
