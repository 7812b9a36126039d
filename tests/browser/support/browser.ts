import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { afterAll, beforeAll, expect, inject, onTestFinished } from 'vitest';

export type DemoRole = 'planner' | 'safety-officer' | 'crew' | 'administrator';

/** Sizes that the screens are made for. */
export const SIZES = {
  phone: { width: 390, height: 844 },
  tablet: { width: 820, height: 1180 },
  desk: { width: 1280, height: 800 },
  wide: { width: 1920, height: 1080 },
} as const;

export type Visit = {
  readonly size?: keyof typeof SIZES;
  readonly theme?: 'paper' | 'night';
  readonly touch?: boolean;
  /** Complaints that the test provokes on purpose. */
  readonly expectedComplaints?: RegExp;
};

let browser: Browser | undefined;

/** One Chromium a test file. */
export function withChromium(): void {
  beforeAll(async () => {
    browser = await chromium.launch({
      executablePath: process.env.CHROMIUM || '/usr/bin/chromium',
      args: ['--no-sandbox', '--disable-background-networking', '--disable-gpu'],
    });
  });
  afterAll(() => browser?.close());
}

export const addressOf = (path: string): string => `${inject('address')}${path}`;

/** The demo's person of a role. */
export function personOf(role: DemoRole) {
  const found = inject('signIns').find((person) => person.role === role);
  if (!found) throw new Error(`The demo has no ${role}.`);
  return found;
}

/**
 * A fresh browser with nobody signed in. At the test's end whatever it complained about fails the
 * test: an error in a page, or something that the content policy kept from happening.
 */
export async function openPage(visit: Visit = {}): Promise<Page> {
  if (!browser) throw new Error('withChromium() is missing at the top of this file.');
  const context = await browser.newContext({
    baseURL: inject('address'),
    viewport: SIZES[visit.size ?? 'desk'],
    hasTouch: visit.touch ?? false,
    colorScheme: visit.theme === 'night' ? 'dark' : 'light',
  });
  const complaints = gatherComplaints(context);
  onTestFinished(async () => {
    await context.close();
    const { expectedComplaints } = visit;
    expect(complaints.filter((text) => !expectedComplaints?.test(text))).toEqual([]);
  });
  return context.newPage();
}

function gatherComplaints(context: BrowserContext): string[] {
  const complaints: string[] = [];
  context.on('weberror', (error) => complaints.push(error.error().message));
  context.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  return complaints;
}

/** Signs in through the form, as a person would. */
export async function signIn(page: Page, role: DemoRole): Promise<void> {
  const { email, password } = personOf(role);
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}

/** A page of somebody who has signed in. */
export async function openPageAs(role: DemoRole, visit?: Visit): Promise<Page> {
  const page = await openPage(visit);
  await signIn(page, role);
  return page;
}
