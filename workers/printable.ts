// what a terminal would obey instead of showing, but for the end of a line and the tabulator
const CONTROLS = /[\u0000-\u0008\u000b-\u001f\u007f-\u009f]/g;

/** A text that a terminal shows as it is. */
export function printable(text: string): string {
  return text.replace(CONTROLS, '\ufffd');
}
