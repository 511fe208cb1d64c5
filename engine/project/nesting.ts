/**
 * Whether the brackets and braces of a text, those in its strings left out, are ever open to more than a
 * depth; whether the text is JSON does not matter.
 */
export function nestsDeeperThan(depth: number, text: string): boolean {
  let open = 0;
  for (let i = 0; i < text.length; i += 1) {
    const letter = text[i];
    if (letter === '"') i = endOfString(text, i);
    else if (letter === '[' || letter === '{') open += 1;
    else if (letter === ']' || letter === '}') open -= 1;
    if (open > depth) return true;
  }
  return false;
}

/** Position of the quotation mark that ends the JSON string which starts at `start`; the text's end if none does. */
export function endOfString(text: string, start: number): number {
  for (let end = text.indexOf('"', start + 1); end >= 0; end = text.indexOf('"', end + 1)) {
    let backslashes = 0;
    while (text[end - 1 - backslashes] === '\\') backslashes += 1;
    if (backslashes % 2 === 0) return end;
  }
  return text.length;
}
