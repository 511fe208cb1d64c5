const LONGEST_TEXT = 60;

/** A value of a file in a few words, whatever it is: 'the number -3', 'a list of 4', 'the text "abc"'. */
export function describeFound(value: unknown): string {
  if (value === null) return 'null';
  if (Array.isArray(value)) return value.length === 0 ? 'an empty list' : `a list of ${value.length}`;
  switch (typeof value) {
    case 'undefined':
      return 'nothing';
    case 'number':
      return Number.isFinite(value) ? `the number ${numberInWords(value)}` : 'a number too large to hold';
    case 'string':
      return `the text ${quoted(value)}`;
    case 'boolean':
      return String(value);
    default:
      return 'an object';
  }
}

/** A text in quotation marks, shortened where it is long, without control characters. */
export function quoted(text: string): string {
  const short = text.length > LONGEST_TEXT ? `${text.slice(0, LONGEST_TEXT)}…` : text;
  return `"${short.replace(/[\u0000-\u001f\u007f-\u009f\u2028\u2029]/g, ' ')}"`;
}

/** A number as it would be typed, −0 told apart from 0. */
export function numberInWords(value: number): string {
  return Object.is(value, -0) ? '-0' : String(value);
}
