import { emptyLayout, type Layout, type SiteGround } from '../lib/layout';
import { writeExchange } from '../lib/layout/exchange';
import { limitsFrom } from '../lib/limits';
import { DEMO_LIMITS, DEMO_SITES } from './demo';
import { dunmarrowGround } from './ground/dunmarrow-siding';
import { harrowFlatGround } from './ground/harrow-flat-coop';
import { sorrelCreekGround } from './ground/sorrel-creek-ramp';
import { coopAgainstTheWind } from './layouts/coop-against-the-wind';
import { coopStandingPlan } from './layouts/coop-standing-plan';
import { rampPlanA } from './layouts/ramp-plan-a';
import { sidingFirstLook } from './layouts/siding-first-look';
import { sidingPlanB } from './layouts/siding-plan-b';

const GROUNDS: Record<string, SiteGround> = {
  'sorrel-creek-ramp': sorrelCreekGround,
  'dunmarrow-siding': dunmarrowGround,
  'harrow-flat-coop': harrowFlatGround,
};

const LAYOUTS: readonly (readonly [file: string, layout: Layout, ground: SiteGround])[] = [
  ['ramp-plan-a', rampPlanA, sorrelCreekGround],
  ['siding-plan-b', sidingPlanB, dunmarrowGround],
  ['siding-first-look', sidingFirstLook, dunmarrowGround],
  ['coop-against-the-wind', coopAgainstTheWind, harrowFlatGround],
  ['coop-standing-plan', coopStandingPlan, harrowFlatGround],
];

const limits = limitsFrom(DEMO_LIMITS.values, DEMO_LIMITS.acceptance, DEMO_LIMITS.name);

export type DemoFile = { readonly path: string; readonly content: object };

/** Every file of the demonstration as it should stand. */
export function demoFiles(): DemoFile[] {
  const grounds = DEMO_SITES.map(({ key, ground, name, scene }) => {
    const site = GROUNDS[key];
    if (!site) throw new Error(`The demo has no ground for ${key}`);
    const layout = emptyLayout(scene.origin, `${name}, the site's ground`);
    return { path: ground, content: writeExchange({ sheet: { layout, site }, limits }) };
  });
  const layouts = LAYOUTS.map(([file, layout, site]) => ({
    path: `demo/files/${file}.geojson`,
    content: writeExchange({ sheet: { layout, site }, limits }),
  }));
  return [...grounds, ...layouts];
}
