import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { addressOf, openPage, openPageAs, withChromium } from './support/browser';

withChromium();

const APP = join(process.cwd(), 'app');

/** Every address that a file on disk answers, with something plausible for each parameter. */
const ROUTES = readdirSync(APP, { recursive: true, encoding: 'utf8' })
  .filter((file) => /(^|\/)(page\.tsx|route\.ts)$/.test(file))
  .map((file) => ({
    path: `/${file}`
      .replace(/\/(page\.tsx|route\.ts)$/, '')
      .replace(/\/\([^)]+\)/g, '')
      .replace(/\[\.\.\.nextauth\]/, 'session')
      .replace(/\[[^\]]+\]/g, '123e4567-e89b-42d3-a456-426614174000'),
    isPage: file.endsWith('page.tsx'),
  }))
  .map(({ path, isPage }) => ({ path: path || '/', isPage }))
  .sort((a, b) => a.path.localeCompare(b.path));

const fetchPlainly = (path: string, headers: Record<string, string> = {}) =>
  fetch(addressOf(path), { headers, redirect: 'manual' });

describe('every answer', () => {
  test('the routes on disk were found', () => {
    expect(ROUTES.filter(({ isPage }) => isPage).length).toBeGreaterThanOrEqual(5);
    expect(ROUTES.filter(({ isPage }) => !isPage).length).toBeGreaterThanOrEqual(10);
  });

  test.each([...ROUTES, { path: '/nothing-here', isPage: true }])(
    '$path is sent with its headers',
    async ({ path, isPage }) => {
      const { headers } = await fetchPlainly(path);
      expect(headers.get('x-content-type-options')).toBe('nosniff');
      expect(headers.get('x-frame-options')).toBe('DENY');
      expect(headers.get('referrer-policy')).toBe('same-origin');
      expect(headers.get('permissions-policy')).toContain('geolocation=()');
      expect(headers.get('x-powered-by')).toBeNull();
      expect(headers.get('strict-transport-security'), 'plain HTTP').toBeNull();

      const policy = headers.get('content-security-policy') ?? '';
      expect(policy).toContain("frame-ancestors 'none'");
      expect(policy).toContain("default-src 'none'");
      expect(policy).toContain("base-uri 'none'");
      const scripts = /script-src ([^;]*)/.exec(policy)?.[1] ?? '';
      expect(scripts).not.toContain('unsafe-inline');
      expect(scripts).not.toContain('unsafe-eval');
      if (isPage) expect(scripts).toMatch(/'nonce-[A-Za-z0-9+/]{22}=='/);
      else expect(scripts).toBe('');
    },
  );

  test.each(['/', '/api/health'])('%s asks for TLS once it came by TLS', async (path) => {
    const { headers } = await fetchPlainly(path, { 'x-forwarded-proto': 'https' });
    expect(headers.get('strict-transport-security')).toBe('max-age=63072000; includeSubDomains');
  });
});

test('a nonce is never used twice, and every script of a page carries it', async () => {
  const nonces = new Set<string>();
  for (let i = 0; i < 3; i += 1) {
    const answer = await fetchPlainly('/sign-in');
    const policy = answer.headers.get('content-security-policy') ?? '';
    const nonce = /'nonce-([^']+)'/.exec(policy)?.[1] ?? '';
    const scripts = (await answer.text()).match(/<script\b[^>]*>/g) ?? [];
    expect(scripts.length).toBeGreaterThan(0);
    for (const script of scripts) expect(script).toContain(`nonce="${nonce}"`);
    nonces.add(nonce);
  }
  expect(nonces.size).toBe(3);
});

test('a script that got into a page does not run', async () => {
  const page = await openPage({
    expectedComplaints: /Content Security Policy|Failed to load resource/,
  });
  await page.goto('/sign-in');
  const ran = await page.evaluate(async () => {
    const holder = document.createElement('div');
    holder.innerHTML = '<img src="/no-such" onerror="window.name = \'ran\'">';
    document.body.append(holder);
    await new Promise((later) => setTimeout(later, 500));
    return window.name;
  });
  expect(ran).toBe('');
});

test.each(['/', '/sites', '/kits', '/limits'])(
  '%s has all it needs under its policy',
  async (path) => {
    const page = await openPageAs('planner');
    const answer = await page.goto(path, { waitUntil: 'load' });
    expect(answer?.status()).toBe(200);
    expect(new URL(page.url()).pathname).toBe(path);
    await page.waitForLoadState('networkidle');
  },
);
