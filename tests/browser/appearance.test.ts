import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { buildAndServePage, type BuiltPage } from './builtPage.ts';
import { openChromium } from './openChromium.ts';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

let built: BuiltPage;
let browser: Browser;
let page: Page;

beforeAll(async () => {
  [built, browser] = await Promise.all([buildAndServePage(), openChromium()]);
  page = await browser.newPage({ viewport: { width: 1366, height: 768 } });
  await page.goto(built.address);
  await page.getByRole('heading', { level: 3 }).first().waitFor({ timeout: 40_000 });
  const cancel = page.getByRole('button', { name: 'Cancel' });
  if (await cancel.count()) await cancel.click().catch(() => undefined);
}, 60_000);

afterAll(async () => {
  await browser?.close();
  await built?.close();
});

async function violations(): Promise<string[]> {
  await page.evaluate(axeSource);
  return page.evaluate(async () => {
    const axe = (
      window as unknown as {
        axe: { run(): Promise<{ violations: { id: string; nodes: { html: string }[] }[] }> };
      }
    ).axe;
    const { violations: found } = await axe.run();
    return found.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${id}: ${html.slice(0, 120)}`));
  });
}

describe('how the page looks', () => {
  it.each([
    [390, 844],
    [683, 384], // 1366 × 768 at 200 % zoom
    [1024, 768],
    [1366, 768],
    [1920, 1080],
  ])('is never wider than a window of %i × %i', async (width, height) => {
    await page.setViewportSize({ width, height });
    await page.waitForTimeout(150);
    const { across, widest } = await page.evaluate(() => ({
      across: document.documentElement.scrollWidth - document.documentElement.clientWidth,
      widest: [...document.querySelectorAll('main canvas')].map(
        (canvas) => canvas.getBoundingClientRect().right - innerWidth,
      ),
    }));
    expect(across).toBe(0);
    expect(Math.max(...widest)).toBeLessThanOrEqual(0);
  });

  it('sets nothing smaller than 12 px', async () => {
    const small = await page.evaluate(() =>
      [...document.querySelectorAll('body *')]
        .filter((element) =>
          [...element.childNodes].some((node) => node.nodeType === 3 && node.textContent?.trim()),
        )
        .filter((element) => parseFloat(getComputedStyle(element).fontSize) < 12)
        .map((element) => element.outerHTML.slice(0, 100)),
    );
    expect(small).toEqual([]);
  });

  it.each(['light', 'dark'] as const)(
    'has no accessibility violation in the %s theme',
    async (colorScheme) => {
      await page.setViewportSize({ width: 1366, height: 768 });
      await page.emulateMedia({ colorScheme });
      await page
        .locator('input[type=file]')
        .setInputFiles({ name: 'bad.json', mimeType: 'application/json', buffer: Buffer.from('{}') });
      const table = page.getByRole('button', { name: 'Read as a table' }).first();
      if (await table.count()) await table.click();
      expect(await violations()).toEqual([]);
      await page.getByRole('button', { name: 'Put this list away' }).click();
    },
    20_000,
  );

  it('keeps the drawing in view on a desk while the results scroll', async () => {
    await page.mouse.move(700, 600);
    await page.mouse.wheel(0, 1200);
    await page.waitForTimeout(150);
    const box = await page.locator('svg[role=group]').boundingBox();
    expect(box?.y).toBeGreaterThanOrEqual(0);
    expect((box?.y ?? 0) + (box?.height ?? 0)).toBeLessThan(500);
  });

  it('prints in dark ink whatever the theme', async () => {
    await page.emulateMedia({ colorScheme: 'dark' });
    const ink = () =>
      page.evaluate(() => getComputedStyle(document.documentElement).getPropertyValue('--ink').trim());
    const onScreen = await ink();
    await page.evaluate(() => window.dispatchEvent(new Event('beforeprint')));
    const onPaper = await ink();
    await page.evaluate(() => window.dispatchEvent(new Event('afterprint')));
    const lightness = (hex: string) => parseInt(hex.slice(1, 3), 16);
    expect(lightness(onScreen)).toBeGreaterThan(200);
    expect(lightness(onPaper)).toBeLessThan(60);
    expect(await ink()).toBe(onScreen);
  });
});

describe('the page by keyboard', () => {
  it('reads a curve off with the arrow keys', async () => {
    const slider = page.getByRole('slider').first();
    await slider.focus();
    const before = await slider.getAttribute('aria-valuetext');
    for (let i = 0; i < 20; i += 1) await page.keyboard.press('ArrowLeft');
    const after = await slider.getAttribute('aria-valuetext');
    expect(after).toMatch(/^Above .+ grounds/);
    expect(after).not.toBe(before);
  });

  it('chooses a point on the drawing and a limit in the list', async () => {
    const point = page.getByRole('button', { name: /^Point .+: show its settlement/ }).first();
    await point.focus();
    await page.keyboard.press('Enter');
    expect(await point.getAttribute('aria-pressed')).toBe('true');
    const limit = page.locator('ol button').last();
    await limit.focus();
    await page.keyboard.press('Space');
    expect(await limit.getAttribute('aria-pressed')).toBe('true');
  });

  it('shows where it is', async () => {
    await page.keyboard.press('Tab');
    const outline = await page.evaluate(() => {
      const style = getComputedStyle(document.activeElement as Element);
      return { width: parseFloat(style.outlineWidth), kind: style.outlineStyle };
    });
    expect(outline.kind).not.toBe('none');
    expect(outline.width).toBeGreaterThanOrEqual(2);
  });
});
