import type { SiteFeature } from '../lib/layout';
import { bend } from '../tiles/curves';
import { ditchOutline, roadBand } from '../tiles/prepare';
import type { Scene } from '../tiles/scene';
import type { FromFeet } from './feet';

const SURFACE_WORDS = { asphalt: 'asphalt', concrete: 'concrete', gravel: 'compacted gravel' };

/** What the base map shows that the checks must know: taken from the scene, never drawn twice. */
export function groundOfScene(scene: Scene, feet: FromFeet, volts: Record<string, number>) {
  const features: SiteFeature[] = [
    ...scene.roads.map((road): SiteFeature => ({
      id: road.id,
      kind: 'no-drive',
      rings: [feet.ring(roadBand(road))],
      surface: SURFACE_WORDS[road.surface],
    })),
    ...scene.hardstands.map((stand): SiteFeature => ({
      id: stand.id,
      kind: 'no-drive',
      rings: [feet.ring(stand.outline)],
      surface: SURFACE_WORDS[stand.surface],
    })),
    ...scene.ditches.map((ditch): SiteFeature => ({
      id: ditch.id,
      kind: 'low-ground',
      rings: [feet.ring(ditchOutline(ditch))],
      surface: 'ditch',
    })),
    ...scene.rails.map(({ id, centre }): SiteFeature => ({
      id,
      kind: 'metal-line',
      path: feet.path(bend(centre)),
      what: 'rail',
    })),
    ...metal(scene.fences, 'fence', feet),
    ...metal(scene.guardrails, 'guardrail', feet),
    ...metal(scene.culverts, 'culvert', feet),
    ...scene.overhead.map(({ id, path }): SiteFeature => ({
      id,
      kind: 'overhead-line',
      path: feet.path(path),
      volts: voltsOf(volts, id),
    })),
    ...scene.fixed.map(({ id, name, at }): SiteFeature => ({
      id,
      kind: 'fixed-point',
      label: id,
      at: feet.at(at),
      name,
    })),
  ];
  return features;
}

type Line = { readonly id: string; readonly path: Scene['fences'][number]['path'] };

const metal = (
  lines: readonly Line[],
  what: 'fence' | 'guardrail' | 'culvert',
  feet: FromFeet,
): SiteFeature[] =>
  lines.map(({ id, path }) => ({ id, kind: 'metal-line', path: feet.path(path), what }));

function voltsOf(volts: Record<string, number>, id: string): number {
  const known = volts[id];
  if (known === undefined) throw new Error(`The overhead line ${id} has no voltage in the demo`);
  return known;
}
