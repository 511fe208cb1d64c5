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

const STRINGS_AND_MARKS = /"(?:[^"\\]|\\.)*"|[{}[\],:]/gs;

/**
 * Keys that an object of a JSON text has twice, at most 20 of them.
 *
 * @param text valid JSON
 */
export function repeatedKeys(text: string): RepeatedKey[] {
  const repeated: RepeatedKey[] = [];
  const levels: Level[] = [];
  let expectsKey = false;
  for (const [token] of text.matchAll(STRINGS_AND_MARKS)) {
    const level = levels[levels.length - 1];
    switch (token) {
      case '{':
      case '[':
        levels.push({ keys: token === '{' ? new Set() : null, step: '', position: 0 });
        expectsKey = token === '{';
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
      case ':':
        break;
      default:
        if (!expectsKey) break;
        expectsKey = false;
        level.step = JSON.parse(token) as string;
        if (level.keys!.has(level.step) && repeated.length < MOST_NAMED) {
          repeated.push({ pointer: pointerOf(levels), key: level.step });
        }
        level.keys!.add(level.step);
    }
  }
  return repeated;
}

const MOST_NAMED = 20;

function pointerOf(levels: readonly Level[]): string {
  return levels
    .map(({ keys, step, position }) => (keys === null ? String(position) : step))
    .map((step) => `/${step.replaceAll('~', '~0').replaceAll('/', '~1')}`)
    .join('');
}
