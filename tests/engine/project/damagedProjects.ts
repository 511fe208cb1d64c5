import fc from 'fast-check';
import { fullProject, plainProject, type Loose } from './plainProject.ts';

/** A project with one thing changed in it. */
export interface DamagedProject {
  readonly project: Loose;
  /** In words, to find it again. */
  readonly change: string;
  /** Whether the change is of one value or one shape, so that nothing between values can be at fault. */
  readonly isSingle: boolean;
}

interface Change {
  readonly name: string;
  readonly isSingle: boolean;
  /** Changes the member `key` of `parent` in place; says whether there was something to change. */
  readonly apply: (parent: Loose, key: string | number) => boolean;
}

const isList = Array.isArray;
const isObject = (value: Loose) => typeof value === 'object' && value !== null && !isList(value);

function replace(
  name: string,
  fits: (value: Loose) => boolean,
  by: (value: Loose) => Loose,
  isSingle = true,
): Change {
  const apply = (parent: Loose, key: string | number) => {
    if (!fits(parent[key])) return false;
    parent[key] = by(parent[key]);
    return true;
  };
  return { name, isSingle, apply };
}

function replaceNumber(name: string, by: (value: number) => number, isSingle = false): Change {
  return replace(name, (value) => typeof value === 'number', by, isSingle);
}

/** Changes that can be made to any member of a project. */
export const CHANGES: readonly Change[] = [
  replace(
    'null',
    () => true,
    () => null,
  ),
  replace(
    'a text',
    (value) => typeof value !== 'string',
    () => 'seven',
  ),
  replace(
    'an empty text',
    (value) => typeof value === 'string',
    () => '',
  ),
  replace(
    'an empty list',
    (value) => !isList(value),
    () => [],
  ),
  replace(
    'an empty object',
    (value) => !isObject(value),
    () => ({}),
  ),
  replace(
    'true',
    (value) => typeof value !== 'boolean',
    () => true,
  ),
  replace(
    'a number',
    (value) => typeof value !== 'number' && !isObject(value),
    () => 7.25,
  ),
  replace(
    'in a list',
    () => true,
    (value) => [value],
  ),
  replace('a strange key in it', isObject, (value) => ({ ...value, colour: 'blue' })),
  replace('a key __proto__ in it', isObject, (value) =>
    JSON.parse(
      JSON.stringify(value).replace(
        '{',
        Object.keys(value).length > 0 ? '{"__proto__":{"a":1},' : '{"__proto__":1',
      ),
    ),
  ),
  replace('a constructor in it', isObject, (value) => ({ ...value, constructor: { prototype: 1 } })),
  replaceNumber('1e300', () => 1e300, true),
  replaceNumber('-1e300', () => -1e300, true),
  replaceNumber('its opposite', (value) => -value),
  replaceNumber('0', () => 0),
  replaceNumber('-0', () => -0),
  replaceNumber('a thousandth', (value) => value / 1000),
  replaceNumber('a thousandfold', (value) => value * 1000),
  replaceNumber('a little more', (value) => value * 1.01),
  replaceNumber('a little less', (value) => value * 0.99),
  replaceNumber('half', (value) => value * 0.5),
  replaceNumber('double', (value) => value * 2),
  {
    name: 'taken out',
    isSingle: false,
    apply: (parent, key) => {
      if (isList(parent)) parent.splice(Number(key), 1);
      else delete parent[key];
      return true;
    },
  },
  {
    name: 'a second time',
    isSingle: false,
    apply: (parent, key) => {
      if (!isList(parent)) return false;
      parent.push(parent[Number(key)]);
      return true;
    },
  },
  {
    name: 'misspelt',
    isSingle: true,
    apply: (parent, key) => {
      if (isList(parent)) return false;
      parent[`${String(key)}x`] = parent[key];
      delete parent[key];
      return true;
    },
  },
  {
    name: 'another value of the file',
    isSingle: false,
    apply: (parent, key) => {
      const other = Object.keys(parent).find((each) => each !== String(key));
      if (other === undefined) return false;
      parent[key] = parent[other];
      return true;
    },
  },
];

function members(
  value: Loose,
  path: string,
  into: { parent: Loose; key: string | number; path: string }[],
): void {
  if (typeof value !== 'object' || value === null) return;
  for (const key of Object.keys(value)) {
    into.push({ parent: value, key: isList(value) ? Number(key) : key, path: `${path}/${key}` });
    members(value[key], `${path}/${key}`, into);
  }
}

/** The changes one after the other, each at a member that its number picks. */
export function damaged(
  isFull: boolean,
  picks: readonly { readonly member: number; readonly change: number }[],
): DamagedProject {
  const project = isFull ? fullProject() : plainProject();
  const done: string[] = [];
  let isSingle = true;
  for (const pick of picks) {
    const all: { parent: Loose; key: string | number; path: string }[] = [];
    members(project, '', all);
    if (all.length === 0) break;
    const { parent, key, path } = all[pick.member % all.length];
    const change = CHANGES[pick.change % CHANGES.length];
    if (!change.apply(parent, key)) continue;
    done.push(`${path}: ${change.name}`);
    isSingle &&= change.isSingle;
  }
  return { project, change: done.join(', '), isSingle };
}

/** Any damaged project, of one change to a few. */
export function damagedProject(most: number): fc.Arbitrary<DamagedProject> {
  const pick = fc.record({ member: fc.nat(9_999), change: fc.nat(CHANGES.length - 1) });
  return fc
    .tuple(fc.boolean(), fc.array(pick, { minLength: 1, maxLength: most }))
    .map(([isFull, picks]) => damaged(isFull, picks));
}

/** So many projects of one change each. */
export function damagedProjects(count: number, seed: number): DamagedProject[] {
  return fc.sample(damagedProject(1), { numRuns: count, seed });
}
