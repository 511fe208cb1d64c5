/** U+2212, as wide as a plus sign and read as 'minus'. */
export const MINUS = '\u2212';

/** U+202F, keeps a number and its unit on one line. */
export const NARROW_SPACE = '\u202f';

/**
 * A number with a fixed count of decimals, commas between thousands and a true minus sign; never '−0'.
 *
 * @param decimals 0 to 20
 * @returns 'none' for NaN, '∞' for an infinite value
 */
export function numberText(value: number, decimals = 0): string {
  if (Number.isNaN(value)) return 'none';
  if (!Number.isFinite(value)) return value > 0 ? '∞' : `${MINUS}∞`;
  const [whole, fraction] = Math.abs(value).toFixed(decimals).split('.');
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, ',');
  const text = fraction === undefined ? grouped : `${grouped}.${fraction}`;
  return value < 0 && /[1-9]/.test(text) ? MINUS + text : text;
}

/** A number as it was entered: at most so many decimals, no zeros at the end. */
export function enteredNumberText(value: number, mostDecimals = 6): string {
  const text = numberText(value, mostDecimals);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** A number with so many significant digits at most, without zeros at the end of its decimals. */
export function significantNumberText(value: number, digits = 3): string {
  return Number.isFinite(value)
    ? enteredNumberText(Number(value.toPrecision(digits)), 12)
    : numberText(value);
}
