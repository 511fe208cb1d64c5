import { readFileSync } from 'node:fs';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { tableAsCsv } from '../../web/chart/dataTable.ts';
import { exceedanceTable } from '../../web/risk/exceedanceTable.ts';
import { buildAndServePage, type BuiltPage } from './builtPage.ts';
import { openChromium } from './openChromium.ts';
import { smallProject } from './smallProject.ts';
import { studyInNode } from './studyInNode.ts';

const demo = readFileSync(new URL('../../public/demo/approach-embankment.json', import.meta.url), 'utf8');

const projectFile = (name: string, realisations: number) =>
  jsonFile('other.json', JSON.stringify(smallProject(name, realisations)));

const jsonFile = (name: string, text: string) => ({
  name,
  mimeType: 'application/json',
  buffer: Buffer.from(text),
});

let built: BuiltPage;
let browser: Browser;
let page: Page;
const requests: string[] = [];
const complaints: string[] = [];

beforeAll(async () => {
  [built, browser] = await Promise.all([buildAndServePage(), openChromium()]);
  page = await browser.newPage({ viewport: { width: 1366, height: 768 } });
  page.on('request', (request) => requests.push(request.url()));
  page.on('pageerror', (error) => complaints.push(String(error)));
  page.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') complaints.push(message.text());
  });
  await page.goto(built.address);
}, 60_000);

afterAll(async () => {
  await browser?.close();
  await built?.close();
});

const heading = (name?: string) => page.getByRole('heading', { level: 1, name });
const open = (file: ReturnType<typeof jsonFile>) => page.locator('input[type=file]').setInputFiles(file);
const done = (realisations: string) =>
  page
    .getByRole('status')
    .filter({ hasText: `${realisations} realisations` })
    .waitFor({ timeout: 30_000 });

describe('the built page, below a sub-path', () => {
  it('shows the finding of the demo as a sentence, and says that the demo is invented', async () => {
    const finding = page.getByRole('heading', { level: 3, name: /equally likely grounds/ }).first();
    await finding.waitFor({ timeout: 30_000 });
    expect(await finding.textContent()).toMatch(
      /(In \d[\d,]* of \d[\d,]* equally likely grounds, .+\.)|(fewer than 1 in)/,
    );
    expect(await heading().textContent()).toBe(JSON.parse(demo).name);
    expect(await page.locator('body').innerText()).toMatch(/invented/i);
  }, 40_000);

  it('draws the section with every layer and point by name', async () => {
    const words = await page.locator('svg[role=group]').getAttribute('aria-label');
    const project = JSON.parse(demo);
    for (const { name } of [...project.layers, ...project.points]) expect(words).toContain(name);
  });

  it('opens another file and answers for it with the same bytes as Node', async () => {
    const file = projectFile('Second crossing', 1000);
    await open(file);
    await heading('Second crossing').waitFor();
    await done('1,000');
    const summary = studyInNode(file.buffer.toString('utf8'));
    const result = summary.quantities[summary.limits[0].quantity];
    await page.getByRole('button', { name: summary.model.limits[0].name }).first().click();
    const download = page.waitForEvent('download');
    await page
      .getByRole('figure')
      .filter({
        has: page.locator('[role=img][aria-label^="Exceedance curve of ' + result.quantity.label + '"]'),
      })
      .getByRole('button', { name: 'Save CSV' })
      .click();
    const saved = readFileSync(await (await download).path(), 'utf8');
    expect(saved.split('\r\n').length).toBeGreaterThan(20);
    expect(saved).toBe(tableAsCsv(exceedanceTable(result)));
  }, 60_000);

  it('shows all faults of a damaged file and keeps the former project', async () => {
    const project = JSON.parse(demo);
    project.handover_years = 'soon';
    project.layers[0].nme = 'misspelt';
    project.sampling.seed = -1.5;
    await open(jsonFile('damaged.json', JSON.stringify(project)));
    const list = page.getByRole('region', { name: /damaged\.json was not opened/ });
    await list.waitFor();
    expect(await list.locator('tbody tr').count()).toBeGreaterThanOrEqual(3);
    expect(await list.innerText()).toContain('nme');
    expect(await heading().textContent()).toBe('Second crossing');
    await list.getByRole('button', { name: 'Put this list away' }).click();
    expect(await list.count()).toBe(0);
  });

  it('says what is wrong with a file that is no project at all', async () => {
    await open(jsonFile('photo.json', '\u0000\u0001 not a project <img src=x onerror=alert(1)>'));
    const list = page.getByRole('region', { name: /photo\.json was not opened: one fault/ });
    await list.waitFor();
    await list.getByRole('button', { name: 'Put this list away' }).click();
  });

  it('takes a file that is dropped on it', async () => {
    const project = smallProject('Dropped <b>project</b>', 200);
    await page.evaluate((text) => {
      const carried = new DataTransfer();
      carried.items.add(new File([text], 'dropped.json', { type: 'application/json' }));
      window.dispatchEvent(new DragEvent('drop', { dataTransfer: carried, cancelable: true }));
    }, JSON.stringify(project));
    await done('200');
    expect(await heading().textContent()).toBe('Dropped <b>project</b>');
    expect(await page.locator('.aside').first().innerText()).toContain('No band yet: 2 replicates');
  }, 30_000);

  it('cancels a long study and keeps what it has answered', async () => {
    await open(projectFile('Long one', 500_000));
    await page.getByRole('heading', { level: 3 }).first().waitFor({ timeout: 20_000 });
    await page.getByRole('button', { name: 'Cancel' }).click();
    const status = page.getByRole('status').filter({ hasText: 'Cancelled:' });
    await status.waitFor({ timeout: 1_000 });
    const said = await status.innerText();
    expect(said).toMatch(/Cancelled: [\d,]+ of 500,000 realisations/);
    await page.waitForTimeout(500);
    expect(await status.innerText()).toBe(said);
  }, 30_000);

  it('asked nothing of any other address, and the browser had nothing to complain of', () => {
    expect(requests.length).toBeGreaterThan(3);
    const own = (url: string) =>
      url.startsWith(built.address) || url.startsWith(`blob:${new URL(built.address).origin}/`);
    expect(requests.filter((url) => !own(url))).toEqual([]);
    expect(complaints).toEqual([]);
  });
});
