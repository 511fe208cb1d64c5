/** A piece of a text: plain, a symbol to be set italic, or the subscript of the symbol before it. */
export interface TextPiece {
  readonly kind: 'plain' | 'symbol' | 'subscript';
  readonly text: string;
}

/**
 * Cuts a text at the trade's symbols, so that C_c, c_v or σ′_p can be set italic with a real subscript.
 * A symbol is one letter (with a prime or not), an underscore and its subscript of letters and digits,
 * standing by itself; also Cc, Cr, Cs, Ck, Cα, cv, σ'p, σ'v0, σz, γw without the underscore.
 */
export function symbolPieces(text: string): TextPiece[] {
  const pieces: TextPiece[] = [];
  let end = 0;
  for (const found of text.matchAll(SYMBOL)) {
    if (found.index > end) pieces.push({ kind: 'plain', text: text.slice(end, found.index) });
    const [whole, letter, subscript, knownLetter, knownSubscript] = found;
    pieces.push({ kind: 'symbol', text: (letter ?? knownLetter).replace("'", '′') });
    pieces.push({ kind: 'subscript', text: subscript ?? knownSubscript });
    end = found.index + whole.length;
  }
  if (end < text.length) pieces.push({ kind: 'plain', text: text.slice(end) });
  return pieces;
}

/** The same text where nothing can be set as a subscript: 'cv of soft clay'. */
export function plainSymbols(text: string): string {
  return symbolPieces(text)
    .map((piece) => piece.text)
    .join('');
}

const SYMBOL =
  /(?<![\p{L}\p{N}_])(?:(\p{L}['′]?)_([\p{L}\p{N}]{1,3})|(C|c|σ['′]|σ|γ)(c|r|s|k|α|v|h|p|v0|z|w))(?![\p{L}\p{N}_])/gu;
