import AxeBuilder from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { describe, expect, test } from 'vitest';
import { DEMO_LAYOUTS } from '@/demo/demo';
import { openPageAs, withChromium } from './support/browser';

withChromium();

const DEMO_NAMES = DEMO_LAYOUTS.map(({ name }) => name);

const PX_PER_MM = 96 / 25.4;
const POINTS_PER_MM = 72 / 25.4;

/** The demo's own layouts: other tests lay copies beside them. */
async function demoLayouts(page: Page): Promise<{ name: string; id: string }[]> {
  const all = await page.evaluate(async () => {
    const json = async (path: string) => (await fetch(path)).json() as Promise<never>;
    const { sites } = (await json('/api/sites')) as { sites: { id: string }[] };
    const lists = await Promise.all(
      sites.map(({ id }) => json(`/api/sites/${id}/layouts`) as Promise<unknown>),
    );
    return lists.flatMap((list) => (list as { layouts: { id: string; name: string }[] }).layouts);
  });
  return DEMO_NAMES.flatMap((name) => all.filter((layout) => layout.name === name).slice(0, 1));
}

async function openHandout(page: Page, id: string, asked = ''): Promise<void> {
  await page.goto(`/layouts/${id}/handout${asked}`);
  await page.locator('.paper-page').first().waitFor();
  await page.evaluate(() => document.fonts.ready);
}

/** What stands where it should not: past its page, over the foot, or cut off in the strip. */
const misplaced = (page: Page) =>
  page.evaluate(() => {
    const found: string[] = [];
    for (const sheet of document.querySelectorAll('.paper-page')) {
      const name = sheet.getAttribute('aria-label');
      const box = sheet.getBoundingClientRect();
      const foot = sheet.querySelector('.paper-foot')!.getBoundingClientRect();
      if (foot.bottom > box.bottom || foot.right > box.right) found.push(`${name}: foot`);
      for (const part of sheet.querySelectorAll('.table-page, .plan-page')) {
        const { right, bottom } = part.getBoundingClientRect();
        if (right > box.right) found.push(`${name}: too wide`);
        if (bottom > foot.top) found.push(`${name}: over its foot`);
      }
      for (const part of sheet.querySelectorAll('.strip, .strip > *, td, th')) {
        if (part.scrollHeight > part.clientHeight + 1 || part.scrollWidth > part.clientWidth + 1) {
          found.push(`${name}: ${part.className || part.tagName} is cut off`);
        }
      }
    }
    return found;
  });

/** Page sizes of a PDF in points. */
const pageSizes = (pdf: Buffer): [number, number][] =>
  [...pdf.toString('latin1').matchAll(/\/MediaBox\s*\[\s*0 0 ([\d.]+) ([\d.]+)\s*\]/g)].map(
    ([, width, height]) => [Number(width), Number(height)],
  );

describe('the handout', () => {
  test.each([
    ['letter', 279.4, 215.9],
    ['a4', 297, 210],
  ])(
    'of every demo layout comes out of the printer on %s, each page whole',
    async (paper, w, h) => {
      const page = await openPageAs('planner');
      for (const { id, name } of await demoLayouts(page)) {
        await openHandout(page, id, `?paper=${paper}`);
        expect(await misplaced(page), name).toEqual([]);
      }
      const pages = await page.locator('.paper-page').count();
      const sizes = pageSizes(await page.pdf({ preferCSSPageSize: true }));
      expect(sizes).toHaveLength(pages);
      for (const [width, height] of sizes) {
        expect(Math.abs(width - w * POINTS_PER_MM)).toBeLessThan(1);
        expect(Math.abs(height - h * POINTS_PER_MM)).toBeLessThan(1);
      }
    },
  );

  test('is true to scale as the browser lays it out, and its bar agrees', async () => {
    const page = await openPageAs('planner', { size: 'wide' });
    const layouts = await demoLayouts(page);
    const ramp = layouts.find(({ name }) => name.includes('plan A'))!;
    await openHandout(page, ramp.id, '?scale=40');
    const placeOf = (label: string) =>
      page.evaluate((wanted) => {
        const text = [...document.querySelectorAll('.plan-drawing [data-layer="label"] text')].find(
          (one) => one.textContent === wanted,
        );
        const id = text?.closest('[data-piece]')?.getAttribute('data-piece');
        const glyph = document.querySelector<SVGGElement>(
          `.plan-drawing [data-piece="${id}"][data-layer="piece"] > g`,
        );
        const { e, f } = glyph!.getScreenCTM()!;
        return { x: e, y: f };
      }, label);
    const cells = page.locator('.paper-page').nth(1).getByRole('row');
    const eastNorth = async (label: string): Promise<[number, number]> => {
      const row = cells.filter({ has: page.getByRole('cell', { name: label, exact: true }) });
      const words = (await row.getByRole('cell').nth(4).textContent()) ?? '';
      const [east, north] = words.split(', ').map((side) => {
        const [value, direction] = side.split(' ');
        return Number(value) * (direction === 'W' || direction === 'S' ? -1 : 1);
      });
      return [east!, north!];
    };
    const [c1, z] = [await placeOf('C1'), await placeOf('Z')];
    const [[ce, cn], [ze, zn]] = [await eastNorth('C1'), await eastNorth('Z')];
    const feet = Math.hypot(ze - ce, zn - cn);
    // Table figures are rounded to a tenth of a foot; 40 ft are an inch.
    const paperFeet = (Math.hypot(z.x - c1.x, z.y - c1.y) / 96) * 40;
    expect(Math.abs(paperFeet - feet)).toBeLessThan(0.15);
    const bar = page.getByRole('img', { name: /^Scale bar of/ });
    const [, length] = /of (\d+) ft/.exec((await bar.getAttribute('aria-label')) ?? '') ?? [];
    const { width } = (await bar.boundingBox())!;
    expect((width / 96) * 40).toBeCloseTo(Number(length), 1);
    expect(width / PX_PER_MM).toBeLessThan(51);
  });

  test('is chosen by paper, measure and scale, and keeps the choice in its address', async () => {
    const page = await openPageAs('crew');
    const [first] = await demoLayouts(page);
    await openHandout(page, first!.id);
    await page.getByLabel('Paper', { exact: true }).selectOption('A4');
    await page.waitForURL(/paper=a4/);
    await page.getByLabel('Measures').selectOption('Metres');
    await page.waitForURL(/units=m/);
    await page.getByLabel('Scale', { exact: true }).selectOption('1:500');
    await page.getByText('1:500 at full size').waitFor();
    await page.reload();
    await page.getByText('1:500 at full size').waitFor();
    expect(await page.getByLabel('Paper', { exact: true }).inputValue()).toBe('a4');
  });

  test.each(['paper', 'night'] as const)('is read by anyone, %s theme', async (theme) => {
    const page = await openPageAs('safety-officer', { theme, size: 'phone' });
    const [first] = await demoLayouts(page);
    await openHandout(page, first!.id);
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(
      390,
    );
  });

  test('every page carries the caution, and the first one says it is not approved', async () => {
    const page = await openPageAs('planner');
    const [first] = await demoLayouts(page);
    await openHandout(page, first!.id);
    const pages = page.locator('.paper-page');
    for (const sheet of await pages.all()) {
      expect(await sheet.innerText()).toContain('The local authority, the locates');
      expect(await sheet.innerText()).toContain('NOT APPROVED');
    }
  });
});
