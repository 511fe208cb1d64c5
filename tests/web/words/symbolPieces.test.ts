import { describe, expect, it } from 'vitest';
import { plainSymbols, symbolPieces } from '../../../web/words/symbolPieces.ts';

const marked = (text: string) =>
  symbolPieces(text)
    .map(({ kind, text: piece }) =>
      kind === 'symbol' ? `<i>${piece}</i>` : kind === 'subscript' ? `_${piece}` : piece,
    )
    .join('');

describe('the symbols in a text', () => {
  it('are told from the words around them', () => {
    expect(marked("σ'p raised to σ'v0 in 3 grounds")).toBe('<i>σ′</i>_p raised to <i>σ′</i>_v0 in 3 grounds');
    expect(marked('Cr set to C_c, ratio c_h/c_v')).toBe(
      '<i>C</i>_r set to <i>C</i>_c, ratio <i>c</i>_h/<i>c</i>_v',
    );
  });

  it('are not seen inside words, and nothing of the text is lost', () => {
    for (const text of ['soft_clay_upper', 'Crest', 'Cross', '<b>', 'recv', '']) {
      expect(
        symbolPieces(text)
          .map((piece) => piece.text)
          .join(''),
      ).toBe(text);
      expect(symbolPieces(text).every((piece) => piece.kind === 'plain')).toBe(true);
    }
  });

  it('are joined where no subscript can be set', () => {
    expect(plainSymbols('c_v of soft clay, σ′_p')).toBe('cv of soft clay, σ′p');
  });
});
