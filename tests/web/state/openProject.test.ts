import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { OpenProject } from '../../../web/state/openProject.svelte.ts';

const demo = readFileSync(new URL('../../../public/demo/approach-embankment.json', import.meta.url), 'utf8');

describe('the project on screen', () => {
  it('stays as it was when a damaged file is refused with all its faults', () => {
    const project = new OpenProject();
    const model = project.open(demo, 'demo.json');
    expect(model).not.toBeNull();
    expect(project.open('{"name": ', 'broken.json')).toBeNull();
    expect(project.model).toBe(model);
    expect(project.fileName).toBe('demo.json');
    expect(project.refused?.fileName).toBe('broken.json');
    expect(project.refused?.faults.length).toBeGreaterThan(0);
  });

  it('forgets a refusal once a good file is opened', () => {
    const project = new OpenProject();
    project.open('[]', 'broken.json');
    expect(project.refused).not.toBeNull();
    project.open(demo, 'demo.json');
    expect(project.refused).toBeNull();
    expect(project.text).toBe(demo);
  });
});
