import type { Model } from './model.ts';

/** Keys whose values say something about a project and change no result. */
const WITHOUT_EFFECT = new Set(['digest', 'notes', 'note', 'source', 'remarks', 'sampling', 'label']);

/**
 * 32 hex digits that change with anything that can change a result, but for `sampling`, which is compared by
 * itself. The project's name, the order of keys in the file, its notes and its sources do not matter, nor whether a default is
 * written out.
 */
export function modelDigest(model: Omit<Model, 'digest'>): string {
  return hash128(canonicalText({ ...model, name: '' }));
}

/** Text that is the same for the same values: keys sorted, numbers in their shortest form. */
function canonicalText(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonicalText).join(',')}]`;
  if (typeof value === 'object' && value !== null) {
    const entries = Object.entries(value)
      .filter(([key]) => !WITHOUT_EFFECT.has(key))
      .sort(([a], [b]) => (a < b ? -1 : 1));
    return `{${entries.map(([key, member]) => `${key}:${canonicalText(member)}`).join(',')}}`;
  }
  return typeof value === 'string' ? JSON.stringify(value) : String(value);
}

const STARTS = [0x243f6a88, 0x85a308d3, 0x13198a2e, 0x03707344];
const FACTORS = [0x9e3779b1, 0x85ebca77, 0xc2b2ae3d, 0x27d4eb2f];

/**
 * Hash of a text, 128 bits: four words, each stirred with every code unit and with its neighbour (own
 * construction from xor, multiplication and rotation; against accidents, not against intent).
 */
export function hash128(text: string): string {
  const words = [...STARTS];
  for (let i = 0; i < text.length; i += 1) {
    const unit = text.charCodeAt(i);
    for (let lane = 0; lane < 4; lane += 1) {
      const mixed = Math.imul(words[lane] ^ unit ^ (words[(lane + 1) & 3] >>> 3), FACTORS[lane]);
      words[lane] = (mixed << 13) | (mixed >>> 19);
    }
  }
  for (let round = 0; round < 8; round += 1) {
    for (let lane = 0; lane < 4; lane += 1) {
      const sum = (words[lane] + words[(lane + 1) & 3] + text.length) | 0;
      words[lane] = Math.imul(sum ^ (sum >>> 15), FACTORS[lane]);
      words[lane] ^= words[lane] >>> 13;
    }
  }
  return words.map((word) => (word >>> 0).toString(16).padStart(8, '0')).join('');
}
