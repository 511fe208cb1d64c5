/** A number without spread. */
export interface Fixed {
  readonly kind: 'fixed';
  readonly value: number;
}

export function makeFixed({ value }: { readonly value: number }): Fixed | string {
  return Number.isFinite(value) ? { kind: 'fixed', value } : 'the value must be a finite number';
}
