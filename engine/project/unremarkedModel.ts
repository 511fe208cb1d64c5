import type { Model } from './model.ts';

/** A model of which only the remarks and the digest are still to be made. */
export type UnremarkedModel = Omit<Model, 'digest' | 'remarks'>;
