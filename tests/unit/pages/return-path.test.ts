import { describe, expect, test } from 'vitest';
import { AFTER_SIGN_IN, returnPath } from '@/components/sign-in/return-path';

const ORIGIN = 'https://plans.example';

describe('where a sign-in leads', () => {
  test.each([
    ['/limits', '/limits'],
    ['/layouts/7/history?version=3#sheet', '/layouts/7/history?version=3#sheet'],
    ['https://plans.example/kits', '/kits'],
  ])('%s is followed', (asked, path) => {
    expect(returnPath(asked, ORIGIN)).toBe(path);
  });

  test.each([
    null,
    '',
    'https://elsewhere.example/sites',
    '//elsewhere.example',
    '/\\elsewhere.example',
    '\\\\elsewhere.example',
    '/.//elsewhere.example',
    'javascript:alert(1)',
    'http://plans.example/kits',
    'https://plans.example.elsewhere.example/',
    '/sign-in?callbackUrl=/sign-in',
  ])('%s leads to the sites instead', (asked) => {
    expect(returnPath(asked, ORIGIN)).toBe(AFTER_SIGN_IN);
  });
});
