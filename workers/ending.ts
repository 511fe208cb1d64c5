/** How the command ends. */
export const DONE = 0;
export const REFUSED = 1;
export const CALLED_WRONGLY = 2;
/** Nobody's input is at fault: a full disk, no memory, a fault of the program. */
export const NOT_FINISHED = 3;
export const INTERRUPTED = 130;

/** A reason to end that has been put in words. */
export class Ending extends Error {
  readonly code: number;
  constructor(code: number, sentence: string) {
    super(sentence);
    this.code = code;
  }
}
