import { readFile } from 'node:fs/promises';
import AxeBuilder from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { describe, expect, test } from 'vitest';
import { addressOf, openPage, openPageAs, personOf, withChromium } from './support/browser';

withChromium();

/** Refused requests are what these tests ask for; the browser mentions each. */
const REFUSALS = /Failed to load resource: the server responded with a status of 4\d\d/;

async function demoSite(page: Page): Promise<string> {
  await page.goto('/sites');
  const href = await page.getByRole('link', { name: 'Dunmarrow siding' }).getAttribute('href');
  return href ?? '';
}

async function demoHistory(page: Page): Promise<string> {
  await page.goto(await demoSite(page));
  const link = page.getByRole('link', { name: /^History of/ }).first();
  return (await link.getAttribute('href')) ?? '';
}

const post = (page: Page, path: string, body: object) =>
  page.evaluate(
    async ([to, sent]) => {
      const headers = { 'content-type': 'application/json' };
      const answer = await fetch(to, { method: 'POST', headers, body: sent });
      if (!answer.ok) throw new Error(`${to} answered ${answer.status}`);
      return ((await answer.json()) as { id: string }).id;
    },
    [path, JSON.stringify(body)] as const,
  );

/** A site of the test's own, last in the list, so that the demo stays as other tests expect it. */
async function ownSite(page: Page, name: string): Promise<string> {
  return `/sites/${await post(page, '/api/sites', { name, at: [-100.9, 42.2] })}`;
}

/** A finished layout on a site of the test's own. */
async function ownLayout(page: Page, name: string): Promise<string> {
  const file = await readFile('tests/fixtures/exchange/everything-met.geojson', 'utf8');
  const site = await ownSite(page, name);
  return post(page, `/api${site}/layouts`, { name, from: { file: JSON.parse(file) } });
}

/** Every page of this file, and how to come to it. */
const PAGES: Record<string, { signedIn: boolean; path: (page: Page) => Promise<string> | string }> =
  {
    'front page': { signedIn: false, path: () => '/' },
    'sign-in': { signedIn: false, path: () => '/sign-in?callbackUrl=%2Flimits' },
    'blank readings page': { signedIn: false, path: () => '/blank-readings' },
    'nothing there': { signedIn: false, path: () => '/no-such-page' },
    sites: { signedIn: true, path: () => '/sites' },
    'a site': { signedIn: true, path: demoSite },
    kits: { signedIn: true, path: () => '/kits' },
    limits: { signedIn: true, path: () => '/limits' },
    'a history': { signedIn: true, path: demoHistory },
  };

const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);

describe.each(Object.entries(PAGES))('%s', (_, { signedIn, path }) => {
  const visit = async (options: Parameters<typeof openPage>[0]) => {
    const seen = { ...options, expectedComplaints: REFUSALS };
    const page = signedIn ? await openPageAs('planner', seen) : await openPage(seen);
    await page.goto(await path(page));
    await page.waitForLoadState('networkidle');
    return page;
  };

  test.each(['paper', 'night'] as const)('axe finds nothing in the %s theme', async (theme) => {
    const page = await visit({ theme });
    const { violations } = await new AxeBuilder({ page })
      .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'])
      .analyze();
    expect(
      violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' | ')}`),
    ).toEqual([]);
  });

  test('a phone shows it without sideways scrolling, with targets of 44 px', async () => {
    const page = await visit({ size: 'phone' });
    expect(await sideways(page)).toBeLessThanOrEqual(0);
    expect(await smallTargets(page)).toEqual([]);
  });

  test('at 400 % zoom of a desk nothing scrolls sideways', async () => {
    const page = await visit({});
    await page.setViewportSize({ width: 320, height: 256 });
    expect(await sideways(page)).toBeLessThanOrEqual(0);
  });

  test('the keyboard comes past a skip link to the sheet', async () => {
    const page = await visit({});
    await page.keyboard.press('Tab');
    await page.keyboard.press('Enter');
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('sheet');
  });
});

/** Controls that a finger would miss; what only shows on focus, and links within text, are let be. */
const smallTargets = (page: Page) =>
  page.evaluate(() =>
    [...document.querySelectorAll<HTMLElement>('a, button, select, input, [role=button]')]
      .filter((element) => {
        const { width, height } = element.getBoundingClientRect();
        const seen = width > 1 && height > 1 && element.checkVisibility();
        const labelled = element.closest('label') ?? element;
        const inText = getComputedStyle(element).display === 'inline';
        return seen && !inText && labelled.getBoundingClientRect().height < 43.5;
      })
      .map((element) => element.outerHTML.slice(0, 120)),
  );

describe('signing in', () => {
  test('what is missing is said beside its field', async () => {
    const page = await openPage();
    await page.goto('/sign-in');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByText('Enter your e-mail address.').waitFor();
    const email = page.getByLabel('E-mail');
    expect(await email.getAttribute('aria-invalid')).toBe('true');
    await page.getByText('Enter your password.').waitFor();
  });

  test('a wrong password and an unknown e-mail get the same plain answer', async () => {
    const page = await openPage({ expectedComplaints: REFUSALS });
    await page.goto('/sign-in');
    const answers: string[] = [];
    for (const email of [personOf('crew').email, 'nobody@quillan-hazmat.example']) {
      await page.getByLabel('E-mail').fill(email);
      await page.getByLabel('Password').fill('not-the-password');
      const answered = page.waitForResponse(/callback\/credentials/);
      await page.getByRole('button', { name: 'Sign in' }).click();
      await answered;
      answers.push(await page.getByRole('alert').filter({ hasText: 'Not signed in' }).innerText());
    }
    expect(answers[0]).toContain('not right');
    expect(answers[1]).toBe(answers[0]);
    expect(await page.getByLabel('E-mail').inputValue()).toBe('nobody@quillan-hazmat.example');
    expect(await page.getByLabel('Password').inputValue()).toBe('');
  });

  test('an unreachable server keeps what was typed', async () => {
    const page = await openPage({ expectedComplaints: /Failed to load resource|Failed to fetch/ });
    await page.goto('/sign-in');
    await page.getByLabel('E-mail').fill('someone@quillan-hazmat.example');
    await page.getByLabel('Password').fill('typed');
    await page.context().setOffline(true);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.getByText('The server can’t be reached.', { exact: false }).waitFor();
    expect(await page.getByLabel('Password').inputValue()).toBe('typed');
  });

  test('it returns to the page asked for, and signing out ends it', async () => {
    const page = await openPage({ expectedComplaints: REFUSALS });
    await page.goto('/limits');
    expect(new URL(page.url()).pathname).toBe('/sign-in');
    const { email, password, name } = personOf('safety-officer');
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password').fill(password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL(/\/limits$/);
    await page.getByText(`${name}, safety officer`).waitFor();
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.getByText('You are signed out.').waitFor();
    await page.goto('/limits');
    expect(new URL(page.url()).pathname).toBe('/sign-in');
  });

  test.each(['https://elsewhere.example/', '//elsewhere.example', '/\\elsewhere.example'])(
    'it never leads away to %s',
    async (target) => {
      const page = await openPage();
      await page.goto(`/sign-in?callbackUrl=${encodeURIComponent(target)}`);
      const { email, password } = personOf('crew');
      await page.getByLabel('E-mail').fill(email);
      await page.getByLabel('Password').fill(password);
      await page.getByRole('button', { name: 'Sign in' }).click();
      await page.waitForURL((url) => url.pathname !== '/sign-in');
      expect(page.url()).toBe(addressOf('/sites'));
    },
  );
});

describe('sites', () => {
  test('searching narrows the list, and says so when nothing is found', async () => {
    const page = await openPageAs('planner');
    await page.goto('/sites');
    const rows = page.getByRole('rowheader').getByRole('link');
    expect(await rows.count()).toBeGreaterThanOrEqual(3);
    await page.getByRole('searchbox').fill('SORREL c');
    await expect.poll(() => rows.allInnerTexts()).toEqual(['Sorrel Creek ramp']);
    await page.getByRole('searchbox').fill('100%_nothing');
    await page.getByText('No site has “100%_nothing”', { exact: false }).waitFor();
  });

  test('each site on the map is a button that opens it', async () => {
    const page = await openPageAs('crew');
    await page.goto('/sites');
    const map = page.getByRole('region', { name: 'Map of the sites listed' });
    await map.getByRole('button', { name: 'Sorrel Creek ramp' }).press('Enter');
    await page.getByRole('heading', { level: 1, name: 'Sorrel Creek ramp' }).waitFor();
  });

  test('a new site is entered and opened; a bad position is explained first', async () => {
    const page = await openPageAs('planner');
    await page.goto('/sites');
    await page.getByRole('button', { name: 'New site' }).click();
    await page.getByLabel('Name', { exact: true }).fill('Yarrow Road tank farm');
    await page.getByLabel('Position').fill('somewhere');
    await page.getByRole('button', { name: 'Enter the site' }).click();
    await page.getByText('Not understood. Write latitude', { exact: false }).waitFor();
    await page.getByLabel('Position').fill('42.2, -100.9');
    await page.getByRole('button', { name: 'Enter the site' }).click();
    await page.getByRole('heading', { level: 1, name: 'Yarrow Road tank farm' }).waitFor();
    await page.getByText('Nothing has been drawn here yet.', { exact: false }).waitFor();
    await page.getByText('42.200000° N, 100.900000° W', { exact: false }).waitFor();
  });

  test('a crew member sees the site but no way to change it', async () => {
    const page = await openPageAs('crew');
    await page.goto('/sites');
    await expect.poll(() => page.getByRole('button', { name: 'New site' }).count()).toBe(0);
    await page.goto(await demoSite(page));
    await page.getByRole('heading', { name: 'What is under and over this ground' }).waitFor();
    expect(await page.getByRole('button', { name: /Change answers/ }).count()).toBe(0);
    expect(await page.getByRole('heading', { name: 'Start a layout' }).count()).toBe(0);
  });

  test('something of nobody here is not found', async () => {
    const page = await openPageAs('planner', { expectedComplaints: REFUSALS });
    const answer = await page.goto('/sites/123e4567-e89b-42d3-a456-426614174000');
    expect(answer?.status()).toBe(404);
    await page.getByRole('heading', { name: 'There is nothing at this address' }).waitFor();
  });
});

describe('a site’s ground', () => {
  const electric = (page: Page) =>
    page
      .getByRole('list', { name: /Owners’ answers/ })
      .getByRole('listitem')
      .first();

  test('an answer is entered, saved and there again after a reload', async () => {
    const page = await openPageAs('planner');
    await page.goto(await ownSite(page, 'Yarrow Road, answers'));
    await page.getByRole('button', { name: 'Change answers and tickets' }).click();
    await page.getByLabel('Sewer: owner’s answer').selectOption('waiting');
    await page.getByRole('button', { name: 'Add a ticket' }).click();
    await page.getByLabel('Ticket').last().fill('QC-TEST-7');
    await page.getByRole('button', { name: 'Save answers and tickets' }).click();
    await page.getByRole('button', { name: 'Change answers and tickets' }).waitFor();
    await page.reload();
    await page.getByText('Sewer: the owner has not answered yet').waitFor();
    await page.getByText('QC-TEST-7').waitFor();
  });

  test('two people at once: the second is told, and neither loses an entry', async () => {
    const [one, other] = [
      await openPageAs('planner', { expectedComplaints: REFUSALS }),
      await openPageAs('safety-officer', { expectedComplaints: REFUSALS }),
    ];
    const site = await ownSite(one, 'Yarrow Road, two at once');
    for (const page of [one, other]) {
      await page.goto(site);
      await page.getByRole('button', { name: 'Change answers and tickets' }).click();
    }
    await one.getByLabel('Electric: owner’s answer').selectOption('marked');
    await one.getByRole('button', { name: 'Save answers and tickets' }).click();
    await one.getByRole('button', { name: 'Change answers and tickets' }).waitFor();

    await other.getByLabel('Communications: owner’s answer').selectOption('waiting');
    await other.getByRole('button', { name: 'Save answers and tickets' }).click();
    await other.getByText(`${personOf('planner').name} saved this ground before you.`).waitFor();
    await other.getByRole('button', { name: 'Save mine too' }).click();
    await other.getByRole('button', { name: 'Change answers and tickets' }).waitFor();

    await one.reload();
    expect(await electric(one).innerText()).toContain('Electric: marked');
    await one.getByText('Communications: the owner has not answered yet').waitFor();
  });
});

describe('starting a layout', () => {
  const start = async (page: Page, file: { name: string; content: string }) => {
    await page.goto(await ownSite(page, `Yarrow Road, ${file.name}`));
    await page.getByLabel('from an exchange file').check();
    await page.getByLabel('Exchange file', { exact: true }).setInputFiles({
      name: file.name,
      mimeType: 'application/geo+json',
      buffer: Buffer.from(file.content),
    });
    await page.getByRole('button', { name: 'Start the layout' }).click();
  };

  test('every fault of a file is listed with its path, and nothing is made', async () => {
    const page = await openPageAs('planner', { expectedComplaints: REFUSALS });
    const feature = (id: string, properties: object, coordinates: unknown) => ({
      type: 'Feature',
      id,
      properties,
      geometry: { type: 'Point', coordinates },
    });
    await start(page, {
      name: 'faulty.geojson',
      content: JSON.stringify({
        type: 'FeatureCollection',
        stillground: { version: 1, origin: [-100, 40] },
        features: [
          feature('a', { kind: 'rod', system: 'X' }, [-100, 40]),
          feature('b', { kind: 'kite' }, [-100, 40]),
          feature('c', { kind: 'tester' }, [-100, 95]),
        ],
      }),
    });
    const faults = page.getByRole('list', { name: 'Faults' }).getByRole('listitem');
    await faults.first().waitFor();
    expect(await faults.count()).toBe(3);
    expect(await faults.allInnerTexts()).toEqual([
      expect.stringContaining('features[0]'),
      expect.stringContaining('features[1]'),
      expect.stringContaining('features[2]'),
    ]);
    await page.getByText('The file has 3 faults. Nothing was changed.').waitFor();
  });

  test('a file that is not JSON is refused before it is sent', async () => {
    const page = await openPageAs('planner');
    await start(page, { name: 'photo.json', content: '\u0089PNG' });
    await page.getByText('photo.json is not an exchange file', { exact: false }).waitFor();
  });

  test('a copy of a layout opens as its own drawing', async () => {
    const page = await openPageAs('planner');
    await ownLayout(page, 'Yarrow Road, to be copied');
    await page.goto('/sites');
    await page.getByRole('link', { name: 'Yarrow Road, to be copied' }).first().click();
    await page.getByLabel('from a layout of this site').check();
    await page.getByLabel('Name', { exact: true }).fill('Copy for a test');
    await page.getByRole('button', { name: 'Start the layout' }).click();
    await page.waitForURL(/\/layouts\/[0-9a-f-]{36}$/);
  });
});

describe('history', () => {
  test('an older version is looked at and restored, and nothing is lost', async () => {
    const page = await openPageAs('planner');
    const layoutId = await ownLayout(page, 'Yarrow Road, looked back at');
    const path = `/layouts/${layoutId}/history`;
    // A second version, saved as the drawing saves.
    const status = await page.evaluate(async (id) => {
      const address = `/api/layouts/${id}`;
      const { version, layout } = await (await fetch(address)).json();
      const answer = await fetch(address, {
        method: 'PUT',
        headers: { 'content-type': 'application/json', 'if-match': `"${version}"` },
        body: JSON.stringify({ layout: { ...layout, pieces: [] }, label: 'Take everything off' }),
      });
      return answer.status;
    }, layoutId);
    expect(status).toBe(200);

    await page.goto(path);
    await page.getByText('Nothing is drawn in this version.').waitFor();
    const versions = page.getByRole('region', { name: 'Versions' }).getByRole('listitem');
    await versions.last().waitFor();
    expect(await versions.count()).toBe(2);
    await versions.last().getByRole('link').click();
    await page.getByRole('img', { name: /Plan of version 1/ }).waitFor();
    await page.getByRole('button', { name: 'Make version 1 the newest' }).click();
    await page.getByText('now holds what version 1 held', { exact: false }).waitFor();
    await expect.poll(() => versions.count()).toBe(3);
    await page.getByText('Take everything off').waitFor();
    await page.goto(path);
    await page.getByRole('img', { name: /Plan of version/ }).waitFor();
  });

  test('a crew member may look but not restore', async () => {
    const page = await openPageAs('crew');
    await page.goto(`${await demoHistory(page)}?version=1`);
    await page.getByRole('heading', { name: /Version 1/ }).waitFor();
    expect(await page.getByRole('button', { name: /the newest/ }).count()).toBe(0);
  });
});

test('the theme that was chosen is there from the first byte', async () => {
  const page = await openPage();
  await page.goto('/');
  await page.getByLabel('Theme').selectOption('night');
  const html = await page.evaluate(() => fetch('/').then((answer) => answer.text()));
  expect(html).toMatch(/<html[^>]*data-theme="night"/);
  expect(
    await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor),
  ).toBe('rgb(17, 24, 22)');
});

test('the blank readings page is one sheet of letter and of A4', async () => {
  const page = await openPage();
  await page.goto('/blank-readings');
  for (const format of ['Letter', 'A4'] as const) {
    const pdf = (await page.pdf({ format })).toString('latin1');
    expect(pdf.match(/\/Type \/Page\b(?!s)/g), format).toHaveLength(1);
  }
});
