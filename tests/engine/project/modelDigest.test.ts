import { describe, expect, it } from 'vitest';
import { checkProject } from '../../../engine/project/checkProject.ts';
import { hash128 } from '../../../engine/project/modelDigest.ts';
import { fullProject, type Loose } from './plainProject.ts';

function digestOf(change: (project: Loose) => void = () => {}): string {
  const project = fullProject();
  change(project);
  const checked = checkProject(JSON.stringify(project));
  if (!checked.ok) throw new Error(JSON.stringify(checked.faults));
  return checked.model.digest;
}

describe('the digest of a model', () => {
  it('is 32 hex digits', () => {
    expect(digestOf()).toMatch(/^[0-9a-f]{32}$/);
  });

  it('changes with what can change a result', () => {
    const digests = [
      digestOf(),
      digestOf((project) => (project.soils[0].compression_index.mean = 0.6000001)),
      digestOf((project) => (project.soils[0].compression_index.varies.share_of_variance = 0.51)),
      digestOf((project) => (project.points[1].x_m = 9.1)),
      digestOf((project) => (project.fill.submergence = true)),
      digestOf((project) => (project.rank_correlations[0].rank_correlation = 0.61)),
      digestOf((project) => (project.limits[0].limit_mm = 501)),
      digestOf((project) => ((project.soils[0].id = 'd'), (project.rank_correlations = []))),
    ];
    expect(new Set(digests).size).toBe(digests.length);
  });

  it('does not change with notes, sources, the sampling, the order of keys or a default written out', () => {
    const same = [
      digestOf((project) => (project.notes = 'other')),
      digestOf((project) => (project.name = 'other')),
      digestOf((project) => (project.soils[0].unit_weight_kN_m3.source.text = 'other')),
      digestOf((project) => (project.soils[0].unit_weight_kN_m3 = 16)),
      digestOf((project) => (project.sampling = { realisations: 1000, seed: 9 })),
      digestOf(
        (project) => (project.soils[0] = Object.fromEntries(Object.entries(project.soils[0]).reverse())),
      ),
      digestOf((project) => delete project.secondary),
    ];
    expect(new Set([...same, digestOf()]).size).toBe(1);
  });

  it('tells apart 200,000 texts that differ in one place', () => {
    const seen = new Set<string>();
    for (let i = 0; i < 100_000; i += 1)
      seen.add(hash128(`thickness:${i / 1000}`)).add(hash128(`a${'b'.repeat(i % 50)}${i}`));
    expect(seen.size).toBe(200_000);
  });

  it('spreads a change of one letter over half of all bits', () => {
    const bits = (text: string) =>
      [...hash128(text)].flatMap((digit) => [...parseInt(digit, 16).toString(2).padStart(4, '0')]);
    let changed = 0;
    for (let i = 0; i < 500; i += 1) {
      const [a, b] = [bits(`value:${i}`), bits(`value:${i}x`)];
      changed += a.filter((bit, k) => bit !== b[k]).length;
    }
    // 500 × 128 fair coins: 64 ± 0.25 (one deviation) a text
    expect(Math.abs(changed / 500 - 64)).toBeLessThan(1);
  });
});
