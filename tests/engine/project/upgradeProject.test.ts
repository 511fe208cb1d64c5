import { describe, expect, it } from 'vitest';
import { CURRENT_VERSION, upgradeProject, UPGRADE_STEPS } from '../../../engine/project/upgradeProject.ts';

const steps = [
  { from: 1, upgrade: (project: Readonly<Record<string, unknown>>) => ({ ...project, width: 2 }) },
  {
    from: 2,
    upgrade: ({ width, ...rest }: Readonly<Record<string, unknown>>) => ({ ...rest, crest_width: width }),
  },
];

describe('the upgrade of an older file', () => {
  it('goes one version at a time up to the current one', () => {
    expect(upgradeProject({ version: 1, name: 'old' }, 1, steps, 3)).toEqual({
      version: 3,
      name: 'old',
      crest_width: 2,
    });
    expect(upgradeProject({ version: 2, width: 7 }, 2, steps, 3)).toEqual({ version: 3, crest_width: 7 });
  });

  it('leaves a current file as it is', () => {
    const project = { version: 3 };
    expect(upgradeProject(project, 3, steps, 3)).toBe(project);
  });

  it('gives none for a newer version, or one before the first', () => {
    expect(upgradeProject({ version: 4 }, 4, steps, 3)).toBeNull();
    expect(upgradeProject({ version: 0 }, 0, steps, 3)).toBeNull();
  });

  it('has a step for every version before the current one', () => {
    expect(UPGRADE_STEPS.map(({ from }) => from)).toEqual(
      Array.from({ length: CURRENT_VERSION - 1 }, (_, i) => i + 1),
    );
  });
});
