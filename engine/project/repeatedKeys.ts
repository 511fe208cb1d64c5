import { endOfString } from './nesting.ts';

/** A key that stands twice in one object, which a JSON parser passes over in silence. */
export interface RepeatedKey {
  readonly pointer: string;
  readonly key: string;
}

interface Level {
  /** null in a list. */
  readonly keys: Set<string> | null;
  step: string;
  position: number;
}

/**
 * Keys that an object of a JSON text has twice, at most 20 of them.
 *
 * @param text valid JSON
 */
export function repeatedKeys(text: string): RepeatedKey[] {
  const repeated: RepeatedKey[] = [];
  const levels: Level[] = [];
  let expectsKey = false;
  for (let i = 0; i < text.length; i += 1) {
    const level = levels[levels.length - 1];
    switch (text[i]) {
      case '{':
      case '[':
        expectsKey = text[i] === '{';
        levels.push({ keys: expectsKey ? new Set() : null, step: '', position: 0 });
        break;
      case '}':
      case ']':
        levels.pop();
        expectsKey = false;
        break;
      case ',':
        level.position += 1;
        expectsKey = level.keys !== null;
        break;
      case '"': {
        const start = i;
        i = endOfString(text, start);
        if (!expectsKey) break;
        expectsKey = false;
        level.step = keyOf(text.slice(start, i + 1));
        if (level.keys!.has(level.step) && repeated.length < MOST_NAMED) {
          repeated.push({ pointer: pointerOf(levels), key: level.step });
        }
        level.keys!.add(level.step);
      }
    }
  }
  return repeated;
}

const MOST_NAMED = 20;

function keyOf(quotedKey: string): string {
  return quotedKey.includes('\\') ? (JSON.parse(quotedKey) as string) : quotedKey.slice(1, -1);
}

function pointerOf(levels: readonly Level[]): string {
  return levels
    .map(({ keys, step, position }) => (keys === null ? String(position) : step))
    .map((step) => `/${step.replaceAll('~', '~0').replaceAll('/', '~1')}`)
    .join('');
}
