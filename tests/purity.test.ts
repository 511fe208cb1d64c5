import { describe, expect, it } from 'vitest';
import { sourceFiles } from './sourceFiles.ts';

/**
 * The engine gives the same bytes in Node and in the browser: of `Math` it uses only what is exact everywhere,
 * and it knows no clock, no chance of its own, no page and no Node.
 */
const EXACT = [
  'sqrt',
  'abs',
  'min',
  'max',
  'floor',
  'ceil',
  'round',
  'trunc',
  'sign',
  'imul',
  'clz32',
  'PI',
  'SQRT2',
];

/** A source without comments and texts, in which words may mean anything. */
function code(text: string): string {
  return text
    .replaceAll(/\/\*[\s\S]*?\*\//g, '')
    .replaceAll(/\/\/.*$/gm, '')
    .replaceAll(/'(?:[^'\\\n]|\\.)*'/g, "''")
    .replaceAll(/`(?:[^`\\$]|\\.|\$(?!\{))*`/g, '``');
}

/** What a code uses that it must not. */
function impurities(text: string): string[] {
  const own = code(text);
  const math = [...own.matchAll(/\bMath\.(\w+)/g)]
    .map((match) => match[1])
    .filter((name) => !EXACT.includes(name));
  const whole = /\bMath\b(?!\.)/.test(own) ? ['Math as a whole'] : [];
  const power = /\*\*/.test(own) ? ['**'] : [];
  const names = [
    ...own.matchAll(
      /\b(Date|performance|process|window|document|globalThis|self|crypto|setTimeout|toLocaleString|localeCompare|Intl)\b/g,
    ),
  ].map((match) => match[1]);
  return [...math, ...whole, ...power, ...names];
}

describe('the engine', () => {
  it('uses nothing that could differ between machines', () => {
    const files = sourceFiles('engine');
    expect(files.length).toBeGreaterThan(60);
    expect(files.flatMap(({ path, text }) => impurities(text).map((what) => `${path}: ${what}`))).toEqual([]);
  });

  it.each([
    'Math.log(x)',
    'x ** y',
    'Date.now()',
    'const { exp } = Math;',
    'Math.random()',
    'process.env.X',
    'a.localeCompare(b)',
  ])('would be caught using %s', (text) => {
    expect(impurities(text)).not.toEqual([]);
  });
});
