import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium, type BrowserContext, type Page } from 'playwright-core';
import { anyFreePort } from '../../scripts/bootstrap/ports.mjs';
import { progressOnStderr } from '../../scripts/bootstrap/say.mjs';
import { drawingReady } from '../browser/support/drawing';
import { serveBuild } from '../browser/support/serve-build';
import { audit, type Audit } from './lighthouse';
import { resultOf, type Bench } from './result';

const RUNS = 5;
const MOST_SCRIPT_KIB = { drawing: 300, other: 160 };
const LEAST_SCORE = 95;
const POINTER_ANSWERED_MS = 60_000;

/** How the pages load for somebody who has signed in, by Lighthouse's desktop preset. */
export const page: Bench = async (tell) => {
  progressOnStderr();
  const { address, signIns, stop } = await serveBuild('npm run bench -- page', 'bench');
  const profile = await mkdtemp(join(tmpdir(), 'stillground-bench-'));
  const port = await anyFreePort();
  // Lighthouse opens its pages in the browser's own context, so that is where the sign-in has to be.
  const context = await chromium.launchPersistentContext(profile, {
    executablePath: process.env.CHROMIUM || '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-background-networking', `--remote-debugging-port=${port}`],
    viewport: { width: 1280, height: 800 },
    baseURL: address,
  });
  try {
    const planner = signIns.find(({ role }) => role === 'planner');
    if (!planner) throw new Error('The demo has no planner.');
    await signIn(context, planner);
    const layout = await someLayout(context);
    const pages = [
      { name: 'front page', path: '/', seo: true, kib: MOST_SCRIPT_KIB.other },
      { name: 'sites', path: '/sites', seo: false, kib: MOST_SCRIPT_KIB.other },
      { name: 'drawing', path: `/layouts/${layout}`, seo: false, kib: null },
      {
        name: 'handout',
        path: `/layouts/${layout}/handout`,
        seo: false,
        kib: MOST_SCRIPT_KIB.other,
      },
    ];
    for (const { name, path, seo, kib } of pages) {
      const audits: Audit[] = [];
      for (let run = 0; run < RUNS; run += 1) {
        await forgetFiles(context);
        audits.push(await audit(`${address}${path}`, port));
      }
      tellAudits(tell, name, audits, seo, kib);
    }
    const kib = await scriptKibUntilPointer(context, `/layouts/${layout}`);
    tell(
      resultOf(
        {
          name: 'page',
          what: 'drawing: encoded scripts until it answers a pointer',
          unit: 'KiB',
          goal: { atMost: MOST_SCRIPT_KIB.drawing },
        },
        [kib],
      ),
    );
  } finally {
    await context.close();
    await stop();
    await rm(profile, { recursive: true, force: true });
  }
};

function tellAudits(
  tell: Parameters<Bench>[0],
  name: string,
  audits: readonly Audit[],
  seo: boolean,
  kib: number | null,
): void {
  const categories = ['performance', 'accessibility', 'best-practices'] as const;
  for (const category of seo ? ([...categories, 'seo'] as const) : categories) {
    tell(
      resultOf(
        { name: 'page', what: `${name}: ${category}`, unit: '', goal: { atLeast: LEAST_SCORE } },
        audits.map((one) => one.scores[category]),
      ),
    );
  }
  tell(
    resultOf(
      { name: 'page', what: `${name}: layout shift`, unit: '', goal: { atMost: 0 } },
      audits.map(({ shift }) => shift),
    ),
  );
  if (kib === null) return;
  tell(
    resultOf(
      { name: 'page', what: `${name}: encoded scripts`, unit: 'KiB', goal: { atMost: kib } },
      audits.map(({ scriptKib }) => scriptKib),
    ),
  );
}

async function signIn(
  context: BrowserContext,
  { email, password }: { email: string; password: string },
): Promise<void> {
  const tab = await context.newPage();
  await tab.goto('/sign-in');
  await tab.getByLabel('E-mail').fill(email);
  await tab.getByLabel('Password').fill(password);
  await tab.getByRole('button', { name: 'Sign in' }).click();
  await tab.waitForURL((url) => url.pathname !== '/sign-in');
  await tab.close();
}

/** As on a first visit, the sign-in apart: Lighthouse itself would clear both or neither. */
async function forgetFiles(context: BrowserContext): Promise<void> {
  const tab = await context.newPage();
  const session = await context.newCDPSession(tab);
  await session.send('Network.clearBrowserCache');
  await tab.close();
}

/** A layout of the first site that has any. */
async function someLayout(context: BrowserContext): Promise<string> {
  const { sites } = await (await context.request.get('/api/sites')).json();
  for (const site of sites) {
    const { layouts } = await (await context.request.get(`/api/sites/${site.id}/layouts`)).json();
    if (layouts.length > 0) return layouts[0].id;
  }
  throw new Error('The demo has no layout.');
}

async function scriptKibUntilPointer(context: BrowserContext, path: string): Promise<number> {
  const tab = await context.newPage();
  const session = await context.newCDPSession(tab);
  await session.send('Network.enable');
  await session.send('Network.setCacheDisabled', { cacheDisabled: true });
  const scripts = new Set<string>();
  let bytes = 0;
  session.on('Network.responseReceived', ({ type, requestId }) => {
    if (type === 'Script') scripts.add(requestId);
  });
  session.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
    if (scripts.has(requestId)) bytes += encodedDataLength;
  });
  await tab.goto(path);
  await answersPointer(tab);
  const kib = bytes / 1024;
  await tab.close();
  return kib;
}

/** A click at a piece's place is answered when the facts of what lies there open. */
async function answersPointer(tab: Page): Promise<void> {
  await drawingReady(tab);
  const box = await tab.locator('button[data-piece]').first().boundingBox();
  if (!box) throw new Error('There is no piece on the plan.');
  await tab.mouse.click(box.x + box.width / 2, box.y + box.height / 2);
  await tab
    .locator('section[aria-label$=", facts"]')
    .first()
    .waitFor({ timeout: POINTER_ANSWERED_MS });
}
