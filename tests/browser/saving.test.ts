import type { Page } from 'playwright-core';
import { describe, expect, test } from 'vitest';
import { openPageAs, withChromium } from './support/browser';
import { drawingReady, saved } from './support/drawing';

withChromium();

/** What the browser itself says of requests that a test makes fail. */
const EXPECTED = /Failed to load resource|net::ERR/;

async function layoutOf(page: Page, name: string): Promise<string> {
  const sites = await page.request.get('/api/sites');
  const { sites: list } = (await sites.json()) as { sites: { id: string }[] };
  const made = await page.request.post(`/api/sites/${list[0]!.id}/layouts`, { data: { name } });
  expect(made.status()).toBe(201);
  return ((await made.json()) as { id: string }).id;
}

async function openDrawing(page: Page, layoutId: string): Promise<void> {
  await page.goto(`/layouts/${layoutId}`);
  await drawingReady(page);
  // The strip is fetched after the plan; these tests type in it once the connection has gone.
  await page.getByRole('region', { name: 'Title block' }).getByRole('heading').waitFor();
}

/** A change that needs no plan: the layout's name, typed in the title block. */
async function rename(page: Page, name: string): Promise<void> {
  const title = page.getByRole('region', { name: 'Title block' });
  await title.getByRole('heading').getByRole('button').click();
  await title.getByRole('textbox', { name: 'Name of the layout' }).fill(name);
  await page.keyboard.press('Enter');
}

const nameOnServer = async (page: Page, layoutId: string): Promise<string | null> => {
  const answer = await page.request.get(`/api/layouts/${layoutId}`);
  return ((await answer.json()) as { layout: { name: string | null } }).layout.name;
};

/** A loaded machine answers later than one at rest. */
const SOON = { timeout: 15_000 };

const saveWords = (page: Page) => page.locator('[data-save]').first();

describe('saving', () => {
  test('without a server the drawing goes on, says so, and saves when it is back', async () => {
    const page = await openPageAs('planner', { expectedComplaints: EXPECTED });
    const layoutId = await layoutOf(page, 'Offline');
    await openDrawing(page, layoutId);
    await page.context().setOffline(true);
    await rename(page, 'Drawn without a connection');
    await expect
      .poll(() => saveWords(page).textContent(), SOON)
      .toBe('No connection, kept in this browser');
    await page.context().setOffline(false);
    await saved(page);
    expect(await nameOnServer(page, layoutId)).toBe('Drawn without a connection');
  });

  test('a page that dies before saving gives its changes back, by choice and undoable', async () => {
    const page = await openPageAs('planner', { expectedComplaints: EXPECTED });
    const layoutId = await layoutOf(page, 'Crash');
    await openDrawing(page, layoutId);
    // On the whole browser, so that nothing slips through while the page is going down.
    const context = page.context();
    await context.route('**/api/layouts/*', (route) =>
      route.request().method() === 'PUT' ? route.abort() : route.continue(),
    );
    await rename(page, 'Not saved when it died');
    await expect.poll(() => saveWords(page).getAttribute('data-save'), SOON).toBe('offline');
    const address = page.url();
    // Closing would not do: the page saves on its way out. A crash gives it no way out.
    const crashed = page.waitForEvent('crash');
    const gone = page.goto('chrome://crash').catch((error: unknown) => String(error));
    await crashed;
    const after = await context.newPage();
    await page.close();
    await gone;
    await context.unroute('**/api/layouts/*');
    await after.goto(address);
    const ask = after.getByRole('alertdialog');
    await ask.getByText('This browser kept changes that were not saved').waitFor();
    await context.unroute('**/api/layouts/*');
    expect(await nameOnServer(after, layoutId)).toBe('Crash');
    await ask.getByRole('button', { name: 'Go on with the kept changes' }).click();
    await saved(after);
    expect(await nameOnServer(after, layoutId)).toBe('Not saved when it died');
    await after.getByRole('button', { name: /^Undo/ }).click();
    await expect.poll(() => nameOnServer(after, layoutId), SOON).toBe('Crash');
    await saved(after);
    await after.reload();
    await drawingReady(after);
    expect(await after.getByRole('alertdialog').count()).toBe(0);
  });

  test('signed out in mid-edit: nothing is lost, and it saves after signing in elsewhere', async () => {
    const page = await openPageAs('planner', { expectedComplaints: EXPECTED });
    const layoutId = await layoutOf(page, 'Signed out');
    await openDrawing(page, layoutId);
    const cookies = await page.context().cookies();
    await page.context().clearCookies();
    await rename(page, 'Drawn while signed out');
    await expect.poll(() => saveWords(page).getAttribute('data-save'), SOON).toBe('signed-out');
    await page.getByText('Sign in in another tab').waitFor();
    await page.context().addCookies(cookies);
    await page.evaluate(() => window.dispatchEvent(new Event('focus')));
    await saved(page);
    expect(await nameOnServer(page, layoutId)).toBe('Drawn while signed out');
  });

  test('two people at once: the second is asked, and keeps both', async () => {
    const page = await openPageAs('planner', { expectedComplaints: EXPECTED });
    const layoutId = await layoutOf(page, 'Two at once');
    await openDrawing(page, layoutId);
    const other = await openPageAs('safety-officer');
    await openDrawing(other, layoutId);
    await rename(other, 'Theirs');
    await saved(other);
    await rename(page, 'Mine');
    const ask = page.getByRole('alertdialog');
    await ask.getByText(/saved this layout while you were drawing/).waitFor();
    expect(await nameOnServer(page, layoutId)).toBe('Theirs');

    await ask.getByRole('button', { name: 'Decide later' }).click();
    expect(await saveWords(page).getAttribute('data-save')).toBe('stale');
    await saveWords(page).click();
    await ask.getByRole('button', { name: /^Take theirs/ }).click();
    await saved(page);
    await page.getByRole('heading', { name: 'Theirs' }).waitFor();

    const site = await page.request.get(`/api/layouts/${layoutId}`);
    const siteId = ((await site.json()) as { site: { id: string } }).site.id;
    const layouts = await page.request.get(`/api/sites/${siteId}/layouts`);
    const names = ((await layouts.json()) as { layouts: { name: string }[] }).layouts;
    expect(names.map(({ name }) => name)).toContainEqual(expect.stringMatching(/^Mine, kept copy/));

    await rename(other, 'Theirs again');
    await saved(other);
    await rename(page, 'Mine over theirs');
    await ask.getByRole('button', { name: /^Keep mine/ }).click();
    await saved(page);
    expect(await nameOnServer(page, layoutId)).toBe('Mine over theirs');
    const changes = await page.request.get(`/api/layouts/${layoutId}/changes`);
    expect(((await changes.json()) as { changes: unknown[] }).changes).toHaveLength(4);
  });
});
