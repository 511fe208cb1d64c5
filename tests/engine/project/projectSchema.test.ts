import { Ajv2020 } from 'ajv/dist/2020.js';
import { readdirSync, readFileSync } from 'node:fs';
import { format, resolveConfig } from 'prettier';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { checkProject } from '../../../engine/project/checkProject.ts';
import { projectSchema } from '../../../engine/project/projectSchema.ts';
import { fullProject, plainProject } from './plainProject.ts';
import { damagedProjects } from './damagedProjects.ts';

const PUBLIC = new URL('../../../public/', import.meta.url);
const schemaText = readFileSync(new URL('schema/project.schema.json', PUBLIC), 'utf8');
const accepts = new Ajv2020({ strict: false, allErrors: false }).compile(JSON.parse(schemaText) as object);

describe('the published schema of the project file', () => {
  it('is the one that the program describes', async () => {
    // written anew by `npx vitest run projectSchema -u`
    const file = fileURLToPath(new URL('schema/project.schema.json', PUBLIC));
    const text = await format(JSON.stringify(projectSchema()), {
      ...(await resolveConfig(file)),
      parser: 'json',
    });
    await expect(text).toMatchFileSnapshot(file);
  });

  it('is a valid schema of draft 2020-12', () => {
    expect(new Ajv2020({ strict: false }).validateSchema(JSON.parse(schemaText) as object)).toBe(true);
  });

  for (const file of readdirSync(new URL('demo/', PUBLIC))) {
    it(`accepts the demo ${file}, as the checker does`, () => {
      const text = readFileSync(new URL(`demo/${file}`, PUBLIC), 'utf8');
      expect(checkProject(text)).toMatchObject({ ok: true });
      expect(accepts(JSON.parse(text))).toBe(true);
    });
  }

  it('accepts a project with every key, and one without any that may be left out', () => {
    for (const project of [fullProject(), plainProject()]) {
      expect(checkProject(JSON.stringify(project))).toMatchObject({ ok: true });
      expect(accepts(project)).toBe(true);
    }
  });

  const damaged = damagedProjects(600, 20_261);
  it(`accepts every one of ${damaged.length} changed files that the checker accepts`, () => {
    const refused = damaged.filter(
      ({ project }) => checkProject(JSON.stringify(project)).ok && !accepts(project),
    );
    expect(refused.map(({ change }) => change)).toEqual([]);
  });

  it('refuses every wrong shape and single value among them', () => {
    const accepted = damaged.filter(({ project, isSingle }) => isSingle && accepts(project));
    const wrong = accepted.filter(({ project }) => !checkProject(JSON.stringify(project)).ok);
    expect(wrong.map(({ change }) => change)).toEqual([]);
  });

  it('sees both accepted and refused files in that test', () => {
    const verdicts = damaged.map(({ project }) => checkProject(JSON.stringify(project)).ok);
    expect(verdicts.filter(Boolean).length).toBeGreaterThan(50);
    expect(verdicts.filter((ok) => !ok).length).toBeGreaterThan(50);
  });
});
