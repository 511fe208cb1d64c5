import { describe, expect, it } from 'vitest';
import { checkProject } from '../../../engine/project/checkProject.ts';
import { faultSentence, type Fault } from '../../../engine/project/fault.ts';
import type { Model } from '../../../engine/project/model.ts';
import { fullProject, plainProject, type Loose } from './plainProject.ts';

function faultsOf(project: Loose): readonly Fault[] {
  const checked = checkProject(typeof project === 'string' ? project : JSON.stringify(project));
  return checked.ok ? [] : checked.faults;
}

function modelOf(project: Loose): Model {
  const checked = checkProject(JSON.stringify(project));
  if (!checked.ok) throw new Error(checked.faults.map(faultSentence).join('\n'));
  return checked.model;
}

/** The faults of a plain or full project after one change. */
function changed(change: (project: Loose) => void, start: Loose = plainProject()): readonly Fault[] {
  change(start);
  return faultsOf(start);
}

/** Refusals that are one fault at one place. */
function refuses(
  title: string,
  pointer: string,
  right: RegExp,
  change: (project: Loose) => void,
  start?: () => Loose,
) {
  it(`refuses ${title}`, () => {
    const faults = changed(change, start?.());
    expect(faults.map((fault) => fault.pointer)).toEqual([pointer]);
    expect(faults[0].right).toMatch(right);
    expect(faults[0].found).not.toBe('');
    expect(faults[0].path).not.toBe('');
  });
}

describe('a project that is right', () => {
  it('becomes a model in engine units', () => {
    const model = modelOf(plainProject());
    expect(model.inputs.map(({ name }) => name)).toEqual([
      'soil/clay/compression_index',
      'soil/clay/initial_void_ratio',
      'soil/clay/cv',
    ]);
    expect(model.inputs.map(({ index }) => index)).toEqual([0, 1, 2]);
    expect(model.layers.map(({ soil }) => soil)).toEqual([0, 1]);
    expect(model.couplings).toEqual({ heldUntil: 1, topUpUnitWeight: null, submergence: true });
    expect(model.secondary).toEqual({ included: true, reductionFloor: 0.1, reductionExponent: 6 });
    expect(model.results).toEqual({ percentiles: [5, 25, 50, 75, 95], degreeOfConsolidation: null });
  });

  it('may have every key and every marginal', () => {
    const model = modelOf(fullProject());
    expect(new Set(model.inputs.map(({ marginal }) => marginal.kind))).toEqual(
      new Set(['normal', 'lognormal', 'uniform', 'triangular', 'pert', 'beta', 'table']),
    );
    // millimetres, and years, become metres
    expect(model.limits.map(({ value }) => value)).toEqual([0.5, 0.1, 0.08, 0.05, 0.01, 0.008, 0.02, 0.03]);
    expect(model.limits.map(({ date }) => date)).toEqual([2, 2, 2, 2, 2, 2, 2, 10]);
    // band drain: 2 (a + b)/π (Hansbo 1979)
    expect(model.drains!.diameter).toBeCloseTo((2 * 0.104) / Math.PI, 12);
    expect(model.lifts[0]).toMatchObject({ standing: true, placing: null });
  });

  it('keeps the mean over a layer of every number but c_v, k0 and c_h/c_v', () => {
    const { inputs } = modelOf(fullProject());
    const without = inputs.filter(({ keepsMean }) => !keepsMean).map(({ name }) => name);
    expect(without).toEqual(['soil/c/cv', 'soil/c/ch_over_cv', 'soil/organic clay/k0']);
  });

  it('calls the inputs of what has an id by it, so that a new name changes none', () => {
    const renamed = fullProject();
    renamed.soils[0].name = 'grey clay';
    renamed.layers[1].soil = 'grey clay';
    expect(modelOf(renamed).inputs.map(({ name }) => name)).toEqual(
      modelOf(fullProject()).inputs.map(({ name }) => name),
    );
  });

  it('may start with a byte-order mark', () => {
    expect(checkProject(`\ufeff${JSON.stringify(plainProject())}`).ok).toBe(true);
  });

  it('reads a number of -0 as 0', () => {
    const text = JSON.stringify(plainProject()).replace('"crest_centre_x_m":0', '"crest_centre_x_m":-0');
    const checked = checkProject(text);
    expect(checked.ok && Object.is(checked.model.lifts[0].crestCentre, 0)).toBe(true);
  });

  it('cuts an uncut normal at the end of its physical range, four deviations away', () => {
    const project = plainProject();
    project.soils[0].initial_void_ratio = { marginal: 'normal', mean: 1.6, deviation: 0.3 };
    const number = modelOf(project).inputs.find(({ name }) => name.endsWith('initial_void_ratio'));
    expect(number?.marginal).toMatchObject({ low: 0, high: Infinity });
  });
});

describe('a text that is no project', () => {
  const texts: [string, string, string][] = [
    ['nothing', '', ''],
    ['a text that is not JSON', '{"format": "slow-ground-project",', ''],
    ['NaN', '{"version": NaN}', ''],
    ['a comment', '// {}', ''],
    ['null', 'null', ''],
    ['a list', '[]', ''],
    ['a number', '7', ''],
  ];
  for (const [title, text, pointer] of texts) {
    it(`is refused: ${title}`, () => {
      const faults = faultsOf(text);
      expect(faults).toHaveLength(1);
      expect(faults[0].pointer).toBe(pointer);
    });
  }

  it('is refused before it is read where it is over 20 MB', () => {
    expect(faultsOf(`"${'a'.repeat(20_000_000)}"`)[0].found).toBe('more than 20 MB');
    expect(faultsOf(`"${'é'.repeat(10_000_000)}"`)[0].found).toBe('more than 20 MB');
  });

  it('is refused with a sentence where it nests a hundred thousand deep', () => {
    for (const text of [
      '['.repeat(100_000) + ']'.repeat(100_000),
      '{"soils":'.repeat(100_000) + '1' + '}'.repeat(100_000),
      `{"soils":${'['.repeat(100_000)}${']'.repeat(100_000)}}`,
    ]) {
      expect(faultsOf(text).map(({ found }) => found)).toEqual(['brackets nested more than 100 deep']);
    }
  });

  it('is refused by name where its version is newer', () => {
    const faults = changed((project) => (project.version = 2));
    expect(faults).toHaveLength(1);
    expect(faults[0]).toMatchObject({
      pointer: '/version',
      found: 'version 2, which is newer than this program',
    });
  });

  refuses('another format', '/format', /slow-ground-project/, (project) => (project.format = 'other'));
  refuses('a version that never was', '/version', /version 1/, (project) => (project.version = 0));
});

describe('keys', () => {
  refuses('a missing key', '/water', /key "water"/, (project) => delete project.water);
  refuses('an extra key', '/colour', /one of the keys/, (project) => (project.colour = 'blue'));

  it('names the nearest right key for a misspelt one', () => {
    const faults = changed((project) => {
      project.soils[0].initial_viod_ratio = project.soils[0].initial_void_ratio;
      delete project.soils[0].initial_void_ratio;
    });
    expect(faults.find(({ pointer }) => pointer === '/soils/0/initial_viod_ratio')?.right).toBe(
      'the key "initial_void_ratio"',
    );
  });

  it('refuses __proto__ and constructor like any other strange key, and takes nothing from them', () => {
    const text = JSON.stringify(plainProject()).replace(
      '{',
      '{"__proto__":{"drains":{"foot_m":3}},"constructor":1,',
    );
    expect(faultsOf(text).map(({ pointer }) => pointer)).toEqual(['/__proto__', '/constructor']);
    expect(({} as Loose).drains).toBeUndefined();
  });

  it('refuses a key that stands twice in one object', () => {
    const text = JSON.stringify(plainProject()).replace(
      '"compression_index":',
      '"compression_index":0.5,"compression_index":',
    );
    expect(faultsOf(text).map(({ pointer }) => pointer)).toEqual(['/soils/0/compression_index']);
  });

  refuses('null', '/notes', /text/, (project) => (project.notes = null));
  refuses(
    'both ways of giving Cr',
    '/soils/0',
    /exactly one/,
    (project) => (project.soils[0].recompression_index = 0.05),
  );
  refuses(
    'a layer without a thickness',
    '/layers/0',
    /exactly one/,
    (project) => delete project.layers[0].thickness_m,
  );
});

describe('numbers', () => {
  const unitWeight = '/soils/0/unit_weight_kN_m3';
  refuses(
    'text for a number',
    unitWeight,
    /a number/,
    (project) => (project.soils[0].unit_weight_kN_m3 = '16'),
  );
  it('refuses 1e999', () => {
    const faults = faultsOf(
      JSON.stringify(plainProject()).replace('"unit_weight_kN_m3":16', '"unit_weight_kN_m3":1e999'),
    );
    expect(faults.map(({ pointer, found }) => [pointer, found])).toEqual([
      [unitWeight, 'a number too large to hold'],
    ]);
  });
  it('refuses a thickness of -0', () => {
    const faults = faultsOf(JSON.stringify(plainProject()).replace('"thickness_m":5', '"thickness_m":-0'));
    expect(faults.map(({ pointer, found }) => [pointer, found])).toEqual([
      ['/layers/0/thickness_m', 'the number -0'],
    ]);
  });
  refuses(
    'a negative thickness',
    '/layers/0/thickness_m',
    /above 0/,
    (project) => (project.layers[0].thickness_m = -5),
  );
  refuses(
    'a unit weight below that of water',
    unitWeight,
    /from 9.81/,
    (project) => (project.soils[0].unit_weight_kN_m3 = 9),
  );
  refuses(
    'a void ratio of 0',
    '/soils/0/initial_void_ratio',
    /above 0/,
    (project) => (project.soils[0].initial_void_ratio = 0),
  );
  refuses(
    'a central Cr/Cc of 1',
    '/soils/0/recompression_ratio',
    /below 1/,
    (project) => (project.soils[0].recompression_ratio = 1),
  );
  refuses(
    'a central Cr as large as Cc',
    '/soils/0/recompression_index',
    /below that of the compression index/,
    (project) => {
      delete project.soils[0].recompression_ratio;
      project.soils[0].compression_index = 0.5;
      project.soils[0].recompression_index = { marginal: 'uniform', low: 0.4, high: 0.6 };
    },
  );
  refuses(
    'a central OCR below 1',
    '/soils/0/preconsolidation/ocr',
    /from 1/,
    (project) => (project.soils[0].preconsolidation.ocr = 0.9),
  );
  refuses('a median OCR below 1', '/soils/0/preconsolidation/ocr', /median from 1/, (project) => {
    project.soils[0].preconsolidation.ocr = { marginal: 'uniform', low: 0.8, high: 1.1 };
  });
  it('takes an OCR whose tail is below 1', () => {
    expect(
      changed(
        (project) => (project.soils[0].preconsolidation.ocr = { marginal: 'uniform', low: 0.9, high: 1.6 }),
      ),
    ).toEqual([]);
  });
});

describe('marginals', () => {
  const at = '/soils/0/compression_index';
  const put = (marginal: Loose) => (project: Loose) => (project.soils[0].compression_index = marginal);
  refuses(
    'low above best',
    at,
    /best must lie from low to high/,
    put({ marginal: 'triangular', low: 0.7, best: 0.6, high: 0.9 }),
  );
  refuses(
    'best above high',
    at,
    /best must lie from low to high/,
    put({ marginal: 'pert', low: 0.2, best: 0.6, high: 0.5 }),
  );
  refuses(
    'a deviation of 0',
    `${at}/deviation`,
    /above 0/,
    put({ marginal: 'normal', mean: 0.6, deviation: 0 }),
  );
  refuses('a cov below 0', `${at}/cov`, /above 0/, put({ marginal: 'lognormal', mean: 0.6, cov: -0.1 }));
  refuses(
    'a table that falls',
    at,
    /must not fall/,
    put({ marginal: 'table', values: [0.3, 0.5, 0.6, 0.8], cumulative: [0, 0.6, 0.5, 1] }),
  );
  refuses(
    'a share above 1 in a table',
    `${at}/cumulative/1`,
    /from 0 to 1/,
    put({ marginal: 'table', values: [0.3, 0.5, 0.8], cumulative: [0, 1.5, 1] }),
  );
  refuses(
    'a kind that is not known',
    `${at}/marginal`,
    /"lognormal"/,
    put({ marginal: 'lognorml', mean: 0.6, cov: 0.2 }),
  );
  refuses(
    'mean, cov and deviation together',
    at,
    /exactly one/,
    put({ marginal: 'normal', mean: 0.6, cov: 0.1, deviation: 0.1 }),
  );
  refuses(
    'a normal that reaches below 0 without a low',
    at,
    /give it a "low"/,
    put({ marginal: 'normal', mean: 0.6, cov: 0.4 }),
  );
  it('takes that normal with a low', () => {
    expect(changed(put({ marginal: 'normal', mean: 0.6, cov: 0.4, low: 0.1 }))).toEqual([]);
  });
  refuses(
    'a uniform that starts at 0 for what must be above 0',
    `${at}/low`,
    /above 0/,
    put({ marginal: 'uniform', low: 0, high: 0.6 }),
  );
  refuses(
    'a share of variance above 1',
    `${at}/varies/share_of_variance`,
    /at most 1/,
    put({
      marginal: 'lognormal',
      mean: 0.6,
      cov: 0.2,
      varies: { share_of_variance: 1.2, vertical_scale_m: 1, horizontal_scale_m: 30 },
    }),
  );
  refuses(
    'a date that varies along the section',
    '/fill/lifts/0/placing/end_year/varies',
    /none here/,
    (project) => {
      project.fill.lifts[0].placing.end_year = {
        marginal: 'uniform',
        low: 0.3,
        high: 0.4,
        varies: { share_of_variance: 0.5, horizontal_scale_m: 30 },
      };
    },
  );
  refuses(
    'a factor on thickness with another median than 1',
    '/layers/1/thickness_factor',
    /median from 0.999999/,
    (project) => {
      project.layers[1].thickness_factor = { marginal: 'lognormal', mean: 1, cov: 0.2 };
    },
    fullProject,
  );
  refuses(
    'a model factor that is not lognormal',
    '/model_factors/rate/marginal',
    /"lognormal" or "fixed"/,
    (project) => {
      project.model_factors.rate = { marginal: 'uniform', low: 0.5, high: 1.5 };
    },
    fullProject,
  );
  refuses(
    'a smear below 1, which is smaller than the drain',
    '/drains/smear_ratio',
    /from 1/,
    (project) => {
      project.drains.smear_ratio = 0.8;
    },
    fullProject,
  );
});

describe('what stands beside each other', () => {
  refuses(
    'a removal before its placing',
    '/fill/lifts/1/removal/start_year',
    /not before the end of its placing/,
    (project) => {
      project.fill.lifts[1].removal = { start_year: 0.1, end_year: 1.6 };
    },
    fullProject,
  );
  refuses(
    'a placing that ends before it starts',
    '/fill/lifts/0/placing/end_year',
    /not before its start/,
    (project) => {
      project.fill.lifts[0].placing = { start_year: 0.5, end_year: 0.3 };
    },
  );
  refuses(
    'two layers named alike',
    '/layers/1/name',
    /no other layer/,
    (project) => (project.layers[1].name = 'upper clay'),
  );
  refuses(
    'two soils with one id',
    '/soils/1/id',
    /id of its own/,
    (project) => (project.soils[1].id = 'clay'),
  );
  refuses(
    'a soil that is not there, with the nearest',
    '/layers/0/soil',
    /^"clay"$/,
    (project) => (project.layers[0].soil = 'cley'),
  );
  refuses(
    'an output time beyond the horizon',
    '/times/output_years/1',
    /up to the horizon, 30/,
    (project) => {
      project.times.output_years = [1, 31];
    },
  );
  refuses(
    'output times that do not rise',
    '/times/output_years/1',
    /rise/,
    (project) => (project.times.output_years = [2, 1]),
  );
  refuses(
    'a handover at the horizon',
    '/times/handover_year',
    /before the horizon/,
    (project) => (project.times.handover_year = 30),
  );
  refuses(
    'drains that reach below the ground',
    '/drains/foot_m',
    /within the layers/,
    (project) => {
      project.drains.foot_m = 40;
      delete project.vacuum;
    },
    fullProject,
  );
  refuses(
    'drains under vacuum that cross an inner free-draining layer',
    '/drains/foot_m',
    /end above it/,
    (project) => {
      project.layers[2].soil = 'sand';
    },
    fullProject,
  );
  refuses(
    'a smeared zone wider than the ground that a drain serves',
    '/drains/smear_ratio',
    /within the ground/,
    (project) => {
      project.drains.smear_ratio = 40;
    },
    fullProject,
  );
  refuses(
    'a standing lift on one that is placed',
    '/fill/lifts/1/standing',
    /standing lifts first/,
    (project) => {
      project.fill.lifts.reverse();
    },
    fullProject,
  );
  refuses(
    'the slope of two points at one x',
    '/limits/4/result',
    /a step has no slope/,
    (project) => {
      project.points[1].x_m = 0;
    },
    fullProject,
  );
  refuses(
    'a limit of a pair for the result of a point',
    '/limits/0/pair',
    /"point" and "limit_mm"/,
    (project) => {
      project.limits[0].pair = 'to the pier';
    },
    fullProject,
  );
  refuses(
    'realisations that are no multiple of 100',
    '/sampling/realisations',
    /multiple of 100/,
    (project) => (project.sampling.realisations = 150),
  );
  refuses(
    'more than a million realisations',
    '/sampling/realisations',
    /to 1000000/,
    (project) => (project.sampling.realisations = 1_000_100),
  );
  refuses('more than 50 layers', '/layers', /1 to 50/, (project) => {
    project.layers = Array.from({ length: 51 }, (_, i) => ({
      name: `layer ${i}`,
      soil: 'clay',
      thickness_m: 1,
    }));
  });
  refuses('more than 200 points', '/points', /1 to 200/, (project) => {
    project.points = Array.from({ length: 201 }, (_, i) => ({ name: `point ${i}`, x_m: i }));
  });
});

describe('files that are made to be slow', () => {
  const long = 19_900_000;
  const texts: [string, () => string][] = [
    ['one long text', () => `{"notes":"${'a'.repeat(long)}"}`],
    ['a text of backslashes', () => `{"notes":"${'\\\\'.repeat(long / 2)}"}`],
    ['a list of numbers', () => `{"soils":[${'1,'.repeat(long / 2)}1]}`],
    ['nesting as deep as it goes', () => `{"soils":${'['.repeat(long / 2)}${']'.repeat(long / 2)}}`],
    ['300,000 strange keys', () => `{${Array.from({ length: 300_000 }, (_, i) => `"key${i}":1`).join()}}`],
  ];
  for (const [title, text] of texts) {
    it(`are refused all the same: ${title}`, { timeout: 30_000 }, () => {
      const started = performance.now();
      expect(faultsOf(text()).length).toBeGreaterThan(0);
      expect(performance.now() - started).toBeLessThan(20_000);
    });
  }
});

describe('faults', () => {
  it('are all found at once', () => {
    const faults = changed((project) => {
      project.soils[0].unit_weight_kN_m3 = 'heavy';
      project.layers[1].thickness_m = -1;
      project.fill.lifts[0].placing.end_year = -3;
      project.times.output_years = [99];
      delete project.boundaries.base;
    });
    expect(faults.map(({ pointer }) => pointer).sort()).toEqual([
      '/boundaries/base',
      '/fill/lifts/0/placing/end_year',
      '/layers/1/thickness_m',
      '/soils/0/unit_weight_kN_m3',
      '/times/output_years/0',
    ]);
  });

  it('say in words where they are', () => {
    const [fault] = changed((project) => (project.soils[0].unit_weight_kN_m3 = 'heavy'));
    expect(faultSentence(fault)).toBe(
      'soil "clay", unit weight: found the text "heavy"; right would be a number from 9.81 to 40, or an object with the key "marginal".',
    );
  });

  it('beyond 200 are counted', () => {
    const faults = changed((project) => {
      project.times.output_years = Array.from({ length: 500 }, () => 'x');
    });
    expect(faults).toHaveLength(201);
    expect(faults[200].found).toBe('300 more faults');
  });
});

describe('remarks', () => {
  const remarks = (change: (project: Loose) => void, start: Loose = plainProject()) => {
    change(start);
    return modelOf(start)
      .remarks.map(({ sentence }) => sentence)
      .join(' ');
  };

  it('say that no layer is compressible', () => {
    expect(remarks((project) => (project.layers[0].soil = 'sand'))).toContain('No layer is compressible');
  });
  it('say that handover lies before a placing ends', () => {
    expect(remarks((project) => (project.times.handover_year = 0.2))).toContain(
      'before the placing of "bank" ends',
    );
  });
  it('say that drains lead nowhere', () => {
    const project = fullProject();
    delete project.vacuum;
    expect(remarks(() => (project.drains.top_m = 1), project)).toContain('they lead nowhere');
  });
  it('say that a coefficient of variation is above 1, and where', () => {
    const project = plainProject();
    project.soils[0].consolidation.cv_m2_per_year.cov = 1.4;
    const remark = modelOf(project).remarks.find(({ sentence }) =>
      sentence.includes('coefficient of variation'),
    );
    expect(remark?.pointer).toBe('/soils/0/consolidation/cv_m2_per_year');
  });
  it('say that too few realisations bear no band', () => {
    expect(remarks((project) => (project.sampling.realisations = 900))).toContain('no confidence band');
    expect(remarks((project) => (project.sampling.realisations = 1000))).not.toContain('no confidence band');
  });
});
