import { describeFound } from './describeFound.ts';
import type { Fault } from './fault.ts';
import type { Model } from './model.ts';
import { modelDigest } from './modelDigest.ts';
import { checkBetweenParts } from './checkBetweenParts.ts';
import { openObject, type OpenedObject } from './openObject.ts';
import { parseProject } from './parseProject.ts';
import { WHOLE_PROJECT } from './place.ts';
import { readCorrelations } from './readCorrelations.ts';
import { readDrains, readVacuum } from './readDrains.ts';
import { readFill } from './readFill.ts';
import { readLayers } from './readLayers.ts';
import { readLimits } from './readLimits.ts';
import { readPairs, readPoints } from './readPoints.ts';
import {
  readBoundaries,
  readModelFactors,
  readResults,
  readSampling,
  readSecondary,
  readWater,
} from './readSettings.ts';
import { readSoils } from './readSoils.ts';
import { readSurfaceLoads } from './readSurfaceLoads.ts';
import { readTimes } from './readTimes.ts';
import { readName, readText } from './readValues.ts';
import { Reading, whole, wholeList } from './reading.ts';
import { remarksOf } from './remarksOf.ts';

/** A checked model, or everything that is wrong with the text. */
export type CheckResult =
  { readonly ok: true; readonly model: Model } | { readonly ok: false; readonly faults: readonly Fault[] };

export const PROJECT_KEYS = {
  required: [
    'format',
    'version',
    'name',
    'soils',
    'layers',
    'water',
    'boundaries',
    'fill',
    'points',
    'times',
    'sampling',
  ],
  optional: [
    '$schema',
    'notes',
    'surface_loads',
    'drains',
    'vacuum',
    'secondary',
    'pairs',
    'limits',
    'model_factors',
    'rank_correlations',
    'results',
  ],
} as const;

/**
 * The model of a project file, or every fault in it; never throws, whatever the text.
 *
 * @param text the file as it is
 */
export function checkProject(text: string): CheckResult {
  const reading = new Reading();
  const project = parseProject(reading, text);
  const opened = project && openObject(reading, WHOLE_PROJECT, project, PROJECT_KEYS);
  const model = opened && readModel(reading, opened);
  if (model === undefined || !reading.faults.isEmpty) return { ok: false, faults: reading.faults.all() };
  const remarked = { ...model, remarks: remarksOf(model, reading.inputPlaces) };
  return { ok: true, model: { ...remarked, digest: modelDigest(remarked) } };
}

function readModel(reading: Reading, project: OpenedObject): Omit<Model, 'digest' | 'remarks'> | undefined {
  if (project.entries.has('$schema') && typeof project.entries.get('$schema') !== 'string') {
    const place = { pointer: '/$schema', path: '$schema' };
    reading.faults.add(
      place,
      describeFound(project.entries.get('$schema')),
      'the address of the schema as a text',
    );
  }
  const { names: soilNames, soils } = readSoils(reading, project);
  const layers = readLayers(reading, project, soilNames);
  const water = readWater(reading, project);
  const boundaries = readBoundaries(reading, project);
  const fill = readFill(reading, project);
  const surfaceLoads = readSurfaceLoads(reading, project);
  const drains = readDrains(reading, project);
  const vacuum = readVacuum(reading, project);
  const modelFactors = readModelFactors(reading, project);
  const points = readPoints(reading, project);
  const pairs = readPairs(reading, project, points.names);
  const times = readTimes(reading, project);
  const limits = readLimits(reading, project, points.names, pairs.names, times);
  const correlations = readCorrelations(reading, project);
  const model = whole<Omit<Model, 'digest' | 'remarks'>>({
    name: readName(reading, project, 'name'),
    notes: readText(reading, project, 'notes'),
    soils: wholeList(soils),
    layers,
    water,
    boundaries,
    lifts: fill?.lifts,
    surfaceLoads,
    drains,
    vacuum,
    couplings: fill &&
      times && {
        heldUntil: fill.heldUntil === 'handover' ? times.handover : fill.heldUntil,
        topUpUnitWeight: fill.topUpUnitWeight,
        submergence: fill.submergence,
      },
    wideFill: fill?.wideFill,
    secondary: readSecondary(reading, project),
    points: points.members,
    pairs: pairs.members,
    handover: times?.handover,
    horizon: times?.horizon,
    outputTimes: times?.outputTimes,
    limits,
    modelFactors,
    sampling: readSampling(reading, project),
    results: readResults(reading, project),
    inputs: reading.inputs,
    correlations,
  });
  checkBetweenParts(reading, {
    soils: wholeList(soils),
    layers,
    lifts: fill?.lifts,
    surfaceLoads,
    drains,
    vacuum,
    boundaries,
    points: points.members,
    pairs: pairs.members,
    limits,
  });
  return model;
}
