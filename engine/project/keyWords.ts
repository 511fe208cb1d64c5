/** Units as they end a key of the file, the longer before the shorter that it ends in. */
const UNITS: readonly (readonly [string, string])[] = [
  ['_kN_m3', 'kN/m³'],
  ['_m2_per_year', 'm²/year'],
  ['_m3_per_year', 'm³/year'],
  ['_mm_per_year', 'mm/year'],
  ['_m_per_s', 'm/s'],
  ['_m_per_m', 'm/m'],
  ['_h_per_v', '1'],
  ['_kPa', 'kPa'],
  ['_mm', 'mm'],
  ['_m', 'm'],
  ['_years', 'year'],
  ['_year', 'year'],
];

/** Keys whose words are not the key itself with blanks. */
const WORDS: Readonly<Record<string, string>> = {
  ocr: 'OCR',
  pop: 'POP',
  cv: 'c_v',
  ch_over_cv: 'c_h/c_v',
  pre_yield_permeability_factor: 'factor on the permeability before yield',
  installed: 'date of installation',
  between: 'inputs',
};

/** A key without its unit: 'unit_weight_kN_m3' → 'unit_weight'. */
export function keyWithoutUnit(key: string): string {
  const unit = UNITS.find(([suffix]) => key.endsWith(suffix));
  return unit === undefined ? key : key.slice(0, -unit[0].length);
}

/** The unit that a key ends in, '1' for a pure number. */
export function unitOfKey(key: string): string {
  return UNITS.find(([suffix]) => key.endsWith(suffix))?.[1] ?? '1';
}

/** A key as it is said: 'unit_weight_kN_m3' → 'unit weight'. */
export function keyInWords(key: string): string {
  const bare = keyWithoutUnit(key);
  return Object.hasOwn(WORDS, bare) ? WORDS[bare] : bare.replaceAll('_', ' ');
}
