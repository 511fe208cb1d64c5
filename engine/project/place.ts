/** A place in a project file. */
export interface Place {
  /** JSON pointer (RFC 6901). */
  readonly pointer: string;
  /** In words, such as 'soil "soft clay", compression index'. */
  readonly path: string;
}

export const WHOLE_PROJECT: Place = { pointer: '', path: 'the project' };

/** The place under a key (or at a position of a list) of another place. */
export function placeWithin(place: Place, key: string | number, words: string): Place {
  const step = String(key).replaceAll('~', '~0').replaceAll('/', '~1');
  return {
    pointer: `${place.pointer}/${step}`,
    path: place.pointer === '' ? words : `${place.path}, ${words}`,
  };
}
