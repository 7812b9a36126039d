import { readdirSync, readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { LAYOUT_VERSION, openLayout, UPGRADES } from '@/lib/layout';

const FOLDER = new URL('../../fixtures/saved/', import.meta.url);
const saved = readdirSync(FOLDER).sort();

test('every version ever saved has its document here, and a step to the next', () => {
  for (let version = 1; version <= LAYOUT_VERSION; version++) {
    expect(saved, `no saved document of version ${version}`).toContain(`layout-v${version}.json`);
    if (version < LAYOUT_VERSION) expect(UPGRADES[version]).toBeTypeOf('function');
  }
  expect(Object.keys(UPGRADES)).toHaveLength(LAYOUT_VERSION - 1);
});

test.each(saved)('%s opens', (name) => {
  const layout = openLayout(JSON.parse(readFileSync(new URL(name, FOLDER), 'utf8')));
  expect(layout.version).toBe(LAYOUT_VERSION);
  expect(layout.pieces.length).toBeGreaterThan(20);
  expect(layout.conditions.wind?.from_deg).toBe(330);
});

test('a newer document and what is no document are refused', () => {
  expect(() => openLayout({ version: LAYOUT_VERSION + 1 })).toThrow(/newer/);
  expect(() => openLayout({ version: 0 })).toThrow(/no way from/);
  expect(() => openLayout('layout')).toThrow();
  expect(() => openLayout(null)).toThrow();
});
