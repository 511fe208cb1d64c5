import { describeFound, quoted } from './describeFound.ts';
import { nestsDeeperThan } from './nesting.ts';
import { WHOLE_PROJECT } from './place.ts';
import type { Reading } from './reading.ts';
import { repeatedKeys } from './repeatedKeys.ts';
import { CURRENT_VERSION, upgradeProject } from './upgradeProject.ts';

/** What the file says it is. */
export const FORMAT = 'slow-ground-project';
const MOST_BYTES = 20_000_000;
const DEEPEST = 100;

/**
 * Text to a project of the current version; undefined, with a fault, where it is too large, not JSON, no
 * object, of another format or of a version that this program does not know.
 */
export function parseProject(reading: Reading, text: string): Readonly<Record<string, unknown>> | undefined {
  if (text.length > MOST_BYTES || bytesOf(text) > MOST_BYTES) {
    reading.faults.add({ pointer: '', path: 'the file' }, 'more than 20 MB', 'a file of at most 20 MB');
    return undefined;
  }
  if (nestsDeeperThan(DEEPEST, text)) {
    const right = 'the keys of a project, which nest to fewer than ten';
    reading.faults.add({ pointer: '', path: 'the file' }, `brackets nested more than ${DEEPEST} deep`, right);
    return undefined;
  }
  let value: unknown;
  try {
    value = JSON.parse(text.startsWith('\ufeff') ? text.slice(1) : text);
  } catch (error) {
    reading.faults.add({ pointer: '', path: 'the file' }, notJson(text, error), 'a project as JSON');
    return undefined;
  }
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    reading.faults.add(WHOLE_PROJECT, describeFound(value), 'an object in braces');
    return undefined;
  }
  for (const { pointer, key } of repeatedKeys(text)) {
    const place = { pointer, path: `key ${quoted(key)}` };
    reading.faults.add(place, `the key ${quoted(key)} twice in one object`, 'each key once');
  }
  return ofCurrentVersion(reading, value as Record<string, unknown>);
}

function ofCurrentVersion(
  reading: Reading,
  project: Readonly<Record<string, unknown>>,
): Readonly<Record<string, unknown>> | undefined {
  const own = (key: string): unknown => (Object.hasOwn(project, key) ? project[key] : undefined);
  const [format, version] = [own('format'), own('version')];
  const place = (key: string) => ({ pointer: `/${key}`, path: key });
  if (format !== FORMAT && Object.hasOwn(project, 'format')) {
    reading.faults.add(place('format'), describeFound(format), quoted(FORMAT));
  }
  if (!Object.hasOwn(project, 'version')) return project;
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 0) {
    reading.faults.add(place('version'), describeFound(version), `the version ${CURRENT_VERSION}`);
    return project;
  }
  const upgraded = upgradeProject(project, version);
  if (upgraded !== null) return upgraded;
  const found =
    version > CURRENT_VERSION
      ? `version ${version}, which is newer than this program`
      : `version ${version}, which there never was`;
  const right =
    version > CURRENT_VERSION
      ? `version ${CURRENT_VERSION}, or a newer program`
      : `version ${CURRENT_VERSION}`;
  reading.faults.add(place('version'), found, right);
  return undefined;
}

/** Length of a text in UTF-8. */
function bytesOf(text: string): number {
  let bytes = 0;
  for (let i = 0; i < text.length; i += 1) {
    const unit = text.charCodeAt(i);
    bytes += unit < 0x80 ? 1 : unit < 0x800 ? 2 : unit >= 0xd800 && unit < 0xe000 ? 2 : 3;
  }
  return bytes;
}

/** Why a text is not JSON, with the line where the parser names a place. */
function notJson(text: string, error: unknown): string {
  if (text.trim() === '') return 'nothing';
  const position = /position (\d+)/.exec(error instanceof Error ? error.message : '');
  if (position === null) return 'a text that is not JSON';
  const line = text.slice(0, Number(position[1])).split('\n').length;
  return `a text that is not JSON from line ${line} on`;
}
