import type { Locator, Page } from 'playwright-core';
import { SITE_KINDS } from '@/lib/layout';

/** What a person does on the drawing, by what is seen of it: ticks, names, buttons. */

export type Feet = readonly [east: number, north: number];

const byName = (page: Page, name: string): Locator =>
  page.locator(`button[data-piece][aria-label^="${name}"]`);

export async function drawingReady(page: Page): Promise<void> {
  await page.locator('[data-tick="left"]').first().waitFor({ state: 'attached', timeout: 60_000 });
  await page.locator('.plan-words').waitFor({ state: 'attached' });
}

/** Reads the border's ticks: where on the screen so many feet east and north of the zero lie. */
export async function groundScale(page: Page): Promise<(feet: Feet) => { x: number; y: number }> {
  const ticks = await page.locator('[data-tick]').evaluateAll((elements) =>
    elements.map((element) => {
      const { left, top } = element.getBoundingClientRect();
      const [number, side] = (element.textContent ?? '').trim().split(' ');
      const value = Number(number) * (side === 'W' || side === 'S' ? -1 : 1);
      return { edge: element.getAttribute('data-tick'), value, px: { left, top } };
    }),
  );
  const line = (edge: 'top' | 'left') => {
    const along = ticks
      .filter((tick) => tick.edge === edge)
      .map(({ value, px }) => ({ value, at: edge === 'top' ? px.left : px.top }))
      .sort((a, b) => a.value - b.value);
    const [first, last] = [along[0]!, along.at(-1)!];
    const perFoot = (last.at - first.at) / (last.value - first.value);
    return (feet: number): number => first.at + (feet - first.value) * perFoot;
  };
  const [x, y] = [line('top'), line('left')];
  return ([east, north]) => ({ x: x(east), y: y(north) });
}

export async function take(page: Page, words: string): Promise<void> {
  await page.locator('[data-stop]', { hasText: words }).first().click();
}

export async function letGo(page: Page): Promise<void> {
  await page.keyboard.press('Escape');
}

/** Takes something from the shelf, puts it on the plan by a click at each place, lets go. */
export async function place(page: Page, words: string, ...places: readonly Feet[]): Promise<void> {
  await take(page, words);
  const at = await groundScale(page);
  for (const feet of places) {
    const px = at(feet);
    await page.mouse.click(px.x, px.y);
  }
  if (await page.locator('[data-stop][aria-pressed="true"]').count()) await letGo(page);
}

/** Drags from one place to another in steps, as a hand does. */
export async function drag(page: Page, from: Feet, to: Feet): Promise<void> {
  const at = await groundScale(page);
  const [a, b] = [at(from), at(to)];
  await page.mouse.move(a.x, a.y);
  await page.mouse.down();
  for (let step = 1; step <= 6; step++) {
    await page.mouse.move(a.x + ((b.x - a.x) * step) / 6, a.y + ((b.y - a.y) * step) / 6);
  }
  await page.mouse.up();
}

/** Opens the stake tag of a piece by a click at its place. */
export async function clickPiece(page: Page, name: string): Promise<void> {
  const box = await byName(page, name).first().boundingBox();
  if (!box) throw new Error(`There is no ${name} on the plan.`);
  await page.mouse.click(box.x + box.width / 2, box.y + box.height / 2);
}

/** Fills a field of the stake tag that is open. */
export async function setFact(page: Page, label: string, value: string): Promise<void> {
  const field = page.locator('section[aria-label$=", facts"]').getByLabel(label, { exact: true });
  if ((await field.evaluate((element) => element.tagName)) === 'SELECT') {
    await field.selectOption(value);
    return;
  }
  await field.fill(value);
  await field.press('Enter');
}

/** The layout's pieces by name and status; of the site's, only those in view have buttons. */
export const pieceNames = (page: Page): Promise<string[]> =>
  page.locator('button[data-piece]').evaluateAll(
    (buttons, siteKinds: readonly string[]) =>
      buttons
        .filter((b) => !siteKinds.includes(b.getAttribute('data-kind') ?? ''))
        .map((b) => b.getAttribute('aria-label') ?? '')
        .sort(),
    SITE_KINDS as readonly string[],
  );

/** Waits until the margin says that the server has everything. */
export async function saved(page: Page): Promise<void> {
  await page.locator('[data-save="saved"]').waitFor({ timeout: 20_000 });
}
