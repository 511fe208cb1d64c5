import { checkProject } from '../engine/project/checkProject.ts';
import type { Model } from '../engine/project/model.ts';

/** The checked model of a project that must be valid; a test that is given another one stops with its faults. */
export function modelOf(project: string | Record<string, unknown>): Model {
  const checked = checkProject(typeof project === 'string' ? project : JSON.stringify(project));
  if (!checked.ok) throw new Error(JSON.stringify(checked.faults, null, 1));
  return checked.model;
}
