import type { Model, Remark } from './model.ts';
export function remarksOf(_model: Omit<Model, 'digest' | 'remarks'>): Remark[] { return []; }
