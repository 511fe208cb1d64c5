/** One thing that is wrong in a project file. */
export interface Fault {
  /** JSON pointer to it (RFC 6901), '' for the whole file. */
  readonly pointer: string;
  /** Where it is, in words: 'soil "soft clay", compression index'. */
  readonly path: string;
  /** What stands there: 'the text "abc"'. */
  readonly found: string;
  /** What would be right: 'a number above 0'. */
  readonly right: string;
}

/** A fault as one sentence. */
export function faultSentence({ path, found, right }: Fault): string {
  return `${path}: found ${found}; right would be ${right}.`;
}
