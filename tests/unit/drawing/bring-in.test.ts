import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { broughtIn, takenWords, type FileSheet } from '@/components/drawing/files/bring-in';
import { applyEdit } from '@/lib/edits';
import { emptyLayout, EMPTY_GROUND, type Sheet } from '@/lib/layout';
import { parseExchange } from '@/lib/layout/exchange';

const parsed = parseExchange(
  JSON.parse(readFileSync('tests/fixtures/exchange/everything-met.geojson', 'utf8')),
);
if (!parsed.ok) throw new Error('the fixture is sound');
const file: FileSheet = parsed;
const empty: Sheet = { layout: emptyLayout([-100, 40], 'Here'), site: EMPTY_GROUND };

test('the file’s pieces take the place of those drawn; name and limits stay ours', () => {
  const sheet = broughtIn(empty, file, { takeGround: false });
  expect(sheet.layout.pieces).toEqual(file.sheet.layout.pieces);
  expect(sheet.layout.name).toBe('Here');
  expect(sheet.site).toBe(empty.site);
  expect(applyEdit(empty, { type: 'replace', sheet })).toEqual(sheet);
});

test('of the file’s ground only what the site lacks is added', () => {
  const [first] = file.sheet.site.features;
  const site = {
    ...EMPTY_GROUND,
    features: [first!],
    answers: { electric: { answer: 'waiting' as const } },
  };
  const sheet = broughtIn({ ...empty, site }, file, { takeGround: true });
  expect(sheet.site.features).toHaveLength(file.sheet.site.features.length);
  expect(sheet.site.answers.electric).toEqual({ answer: 'waiting' });
  expect(sheet.site.answers.sewer).toEqual(file.sheet.site.answers.sewer);
  const twice = broughtIn(sheet, file, { takeGround: true });
  expect(twice.site).toEqual(sheet.site);
});

test('what is left out is said', () => {
  const words = takenWords(empty, file, { takeGround: false });
  expect(words.left[0]).toContain('your agency’s own stay in force');
  expect(words.left[1]).toBe('1 site feature of the file');
  expect(takenWords(empty, file, { takeGround: true }).left).toHaveLength(1);
});
