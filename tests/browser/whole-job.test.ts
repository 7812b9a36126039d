import type { Page } from 'playwright-core';
import { describe, expect, test } from 'vitest';
import { openPageAs, withChromium } from './support/browser';
import {
  clickPiece,
  drag,
  drawingReady,
  letGo,
  pieceNames,
  place,
  saved,
  setFact,
  take,
  type Feet,
} from './support/drawing';

withChromium();

/** Where things go at the Sorrel Creek ramp, feet from the casualty vehicle. */
const PLACES = {
  casualty: [0, 0],
  leak: [10, 3],
  zoneEdge: [45, 0],
  receiver: [30, 91],
  pump: [8, 61],
  rods: [
    [-39.6, 40.6],
    [-42.1, 45],
    [-15.4, 54.6],
    [-17.9, 58.9],
    [-27.5, 47.6],
  ],
  z: [-60, 104],
} as const satisfies Record<string, Feet | readonly Feet[]>;

/** A loaded machine answers later than one at rest. */
const SOON = { timeout: 15_000 };

const OPEN = 'li[data-status="not-met"], li[data-status="not-known"]';
const checks = (page: Page) => page.getByRole('region', { name: 'Checks' });
const openChecks = (page: Page): Promise<string[]> => checks(page).locator(OPEN).allTextContents();

async function newLayout(page: Page, name: string): Promise<string> {
  await page.goto('/sites');
  await page
    .getByRole('link', { name: /Sorrel Creek ramp/ })
    .first()
    .click();
  await page.waitForURL(/\/sites\/./);
  await page.getByLabel('Name').last().fill(name);
  await page.getByRole('button', { name: 'Start the layout' }).click();
  await page.waitForURL(/\/layouts\//);
  await drawingReady(page);
  return new URL(page.url()).pathname.split('/').at(-1)!;
}

async function type(page: Page, region: string, label: string, value: string): Promise<void> {
  const box = page.getByRole('region', { name: region, exact: true });
  const field = box.getByRole('textbox', { name: label, exact: true }).first();
  await field.fill(value);
  await field.press('Enter');
}

/** Wind, slope, liquid and the planned start, as a planner types them. */
async function enterConditions(page: Page): Promise<void> {
  const conditions = page.getByRole('region', { name: 'Conditions', exact: true });
  await conditions.getByRole('button', { name: 'Type in' }).press('Enter');
  await type(page, 'Conditions', 'Wind from', '330');
  await type(page, 'Conditions', 'Swings ±', '20');
  await type(page, 'Conditions', 'Speed', '8');
  await conditions.getByRole('button', { name: 'Now' }).press('Enter');
  await type(page, 'Conditions', 'Downhill to', '150');
  await type(page, 'Conditions', 'Steepness', '3');
  await conditions.getByRole('button', { name: 'Done' }).press('Enter');
  const title = page.getByRole('region', { name: 'Title block' });
  const cell = (label: string) =>
    title.locator('dl > div').filter({ hasText: label }).getByRole('button').first();
  await cell('Liquid').press('Enter');
  await type(page, 'Title block', 'Liquid', 'n-Hexane');
  await type(page, 'Title block', 'UN number', '1208');
  await type(page, 'Title block', 'Flash point', '-9');
  await cell('start not planned').press('Enter');
  await title.getByLabel('Planned start').fill(await inAnHour(page));
  await title.getByLabel('Planned start').press('Enter');
}

/** As the field takes it, in the browser's own zone; the demo's tickets are valid at that time. */
const inAnHour = (page: Page): Promise<string> =>
  page.evaluate(() => {
    const at = new Date(Date.now() + 3_600_000);
    const local = new Date(at.getTime() - at.getTimezoneOffset() * 60_000);
    return local.toISOString().slice(0, 16);
  });

/** The document as the server has it, without who saved it when. */
async function stored(page: Page, layoutId: string): Promise<unknown> {
  const answer = await page.request.get(`/api/layouts/${layoutId}`);
  expect(answer.status()).toBe(200);
  const { layout, site } = (await answer.json()) as { layout: unknown; site: { ground: unknown } };
  return { layout, ground: site.ground };
}

async function reloadsIdentical(page: Page, layoutId: string): Promise<void> {
  await saved(page);
  const [before, names] = [await stored(page, layoutId), await pieceNames(page)];
  await page.reload();
  await drawingReady(page);
  expect(await stored(page, layoutId)).toEqual(before);
  await expect.poll(() => pieceNames(page), SOON).toEqual(names);
}

describe('the whole job', () => {
  test('by pointer: placed, met, saved, opened again, an older version, printed', async () => {
    const page = await openPageAs('planner');
    const layoutId = await newLayout(page, 'Whole job by pointer');
    // The list is fetched after the plan, so that the plan answers first.
    await expect.poll(async () => (await openChecks(page)).length, SOON).toBeGreaterThan(5);

    await page.getByLabel('Kit', { exact: true }).selectOption({ label: 'Hazmat 7 grounding kit' });
    await page.getByLabel('Pump', { exact: true }).selectOption('separate');
    await place(page, 'Casualty', PLACES.casualty);
    await setFact(page, 'Heading', '60');
    await letGo(page);
    await place(page, 'Leak', PLACES.leak);
    await take(page, 'Hot zone');
    await drag(page, PLACES.casualty, PLACES.zoneEdge);
    await letGo(page);
    await place(page, 'Receiver', PLACES.receiver);
    await setFact(page, 'Heading', '60');
    await letGo(page);
    await place(page, 'Pump', PLACES.pump);
    await place(page, 'Rod 6 ft', ...PLACES.rods);
    await place(page, 'Z probe', PLACES.z);
    await letGo(page);
    await enterConditions(page);
    await expect.poll(() => openChecks(page), SOON).toEqual([]);

    // Too far from its partner: not met, shown while it is dragged, and undone again.
    await drag(page, PLACES.rods[3], [-24, 68]);
    await expect
      .poll(() => checks(page).locator('li[data-status="not-met"]').count(), SOON)
      .toBeGreaterThan(0);
    const remedy = checks(page)
      .getByRole('button', { name: /^Move R2/ })
      .first();
    await remedy.click();
    await expect.poll(() => openChecks(page), SOON).toEqual([]);

    await reloadsIdentical(page, layoutId);
    await expect.poll(() => openChecks(page), SOON).toEqual([]);

    await clickPiece(page, 'C2');
    await page.getByRole('button', { name: 'Remove C2' }).click();
    await expect.poll(() => pieceNames(page), SOON).not.toContain('C2, rod, meets');
    await saved(page);
    await page.getByRole('button', { name: 'More' }).click();
    await page.getByRole('link', { name: 'History of this layout' }).click();
    await page.waitForURL(/\/history/);
    const versions = page.locator('ol[reversed] a');
    await versions.nth(1).click();
    await page.getByRole('button', { name: /^Make version \d+ the newest$/ }).click();
    await page.getByRole('link', { name: 'Open the drawing' }).click();
    await drawingReady(page);
    await expect.poll(() => pieceNames(page), SOON).toContain('C2, rod, meets');

    await page.getByRole('link', { name: 'Handout' }).click();
    await page.waitForURL(/\/handout/);
    await page.getByText('NOT APPROVED').first().waitFor();
    const pdf = await page.pdf({ preferCSSPageSize: true });
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    expect(pdf.length).toBeGreaterThan(20_000);
  });

  test('without a mouse: from the shelf and the table to all met, saved and opened again', async () => {
    const page = await openPageAs('planner');
    await page.mouse.move(0, 0);
    const layoutId = await newLayout(page, 'Whole job by keyboard');
    await page.getByLabel('Kit', { exact: true }).selectOption({ label: 'Hazmat 7 grounding kit' });
    await page.getByLabel('Pump', { exact: true }).selectOption('separate');

    // From the shelf the cross stands in the middle of the plan, which is where the site lies.
    await page.locator('[data-stop]', { hasText: 'Casualty' }).focus();
    await page.keyboard.press('Enter');
    await expect
      .poll(() => page.evaluate(() => document.activeElement?.classList.contains('plan-map')), SOON)
      .toBe(true);
    for (const key of ['ArrowUp', 'ArrowDown', 'Enter']) await page.keyboard.press(key);
    const casualty = page.locator('button[data-piece][aria-label^="Casualty vehicle"]');
    await casualty.focus();
    for (let turn = 0; turn < 12; turn++) await page.keyboard.press(']');
    await casualty.press('Enter');
    await expect
      .poll(() => page.getByLabel('Heading', { exact: true }).inputValue(), SOON)
      .toBe('60');
    await page.keyboard.press('Escape');

    await addFromTable(page, 'release point', PLACES.leak);
    await addFromTable(page, 'hot zone', PLACES.casualty, '45');
    await addFromTable(page, 'receiving vehicle', PLACES.receiver);
    await setFact(page, 'Heading', '60');
    await addFromTable(page, 'pump', PLACES.pump);
    for (const rod of PLACES.rods) await addFromTable(page, 'rod', rod);
    await addFromTable(page, 'Z probe', PLACES.z);
    await enterConditions(page);
    await expect.poll(() => openChecks(page), SOON).toEqual([]);

    // Arrow keys on the plan: out of the band, heard at rest, and back by undo.
    const rod = page.locator('button[data-piece][aria-label^="R2,"]');
    await rod.focus();
    for (let step = 0; step < 6; step++) await page.keyboard.press('ArrowUp');
    await expect
      .poll(() => page.locator('[data-announcement]').textContent(), SOON)
      .toMatch(/R2.*not met/);
    for (let step = 0; step < 6; step++) await page.keyboard.press('Control+z');
    await expect.poll(() => pieceNames(page), SOON).toContain('R2, rod, meets');
    await expect.poll(() => openChecks(page), SOON).toEqual([]);
    await reloadsIdentical(page, layoutId);
  });
});

/** Places a piece with the table's form, by bearing and distance, keys only. */
async function addFromTable(
  page: Page,
  kind: string,
  [east, north]: Feet,
  radius?: string,
): Promise<void> {
  const table = page.getByRole('region', { name: 'Pieces', exact: true }).locator('form').first();
  await table.getByLabel('Kind').selectOption({ label: kind });
  const bearing = (Math.atan2(east, north) * 180) / Math.PI;
  await table.getByLabel('Bearing °').fill(String(Number(((bearing + 360) % 360).toFixed(3))));
  await table.getByLabel('Distance ft').fill(String(Number(Math.hypot(east, north).toFixed(2))));
  if (radius) await table.getByLabel('Radius ft').fill(radius);
  await table.getByRole('button', { name: `Place ${kind}` }).press('Enter');
}
