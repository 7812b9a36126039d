import { expect, test } from 'vitest';
import { readExchangeFile } from '@/components/sites/exchange-file';

const file = (content: string) => new File([content], 'plan.geojson');

test('JSON is read as it stands', async () => {
  expect(await readExchangeFile(file('{"type":"FeatureCollection"}'), 100)).toEqual({
    ok: true,
    file: { type: 'FeatureCollection' },
  });
});

test.each([
  ['empty', '', /plan\.geojson is empty\. Nothing was changed\./],
  ['cut short', '{"type":', /can’t be read as GeoJSON .*Nothing was changed\./],
  ['too large', '"'.padEnd(200, 'x'), /larger than .* was not read\. Nothing was changed\./],
])('a file that is %s is refused in words', async (_, content, words) => {
  const read = await readExchangeFile(file(content), 100);
  expect(read.ok).toBe(false);
  expect(read.ok || read.why).toMatch(words);
});
