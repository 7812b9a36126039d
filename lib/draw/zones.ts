import type { PieceOf } from '../layout';
import type { Frame } from './frame';
import { fill, line, stroke } from './marks';
import { hachures, ringWords } from './ring-edge';
import type { Group } from './types';
import { lengthWords } from './words';

/** Words of the zone stand this far inside its edge. */
const WORDS_INSET_PX = 24;
const WORDS_SIZE_PX = 15;

export function drawZone(frame: Frame, zone: PieceOf<'hot-zone' | 'warm-zone'>): Group[] {
  const rings = zone.rings.map((ring) => ring.map(frame.vec));
  const outer = rings[0] ?? [];
  const hot = zone.kind === 'hot-zone';
  const radius = circleRadius(outer);
  const name = hot ? 'HOT ZONE' : 'WARM ZONE';
  const text =
    radius === null ? name : `${name}, ${lengthWords(radius, frame.units, 0).toUpperCase()}`;
  const letters = ringWords(
    frame,
    outer,
    text,
    WORDS_SIZE_PX,
    WORDS_INSET_PX,
    hot ? 'alarm' : 'caution',
  );
  const edge = hot
    ? [
        line(rings, stroke('alarm', 2.25), true, fill('alarm', frame.inkOnly ? 0 : 0.05)),
        line(hachures(frame, rings), stroke('alarm', 1.5)),
      ]
    : [line(rings, stroke('caution', 1.75, { dash: [12, 6] }), true)];
  return [
    {
      id: zone.id,
      layer: 'zone',
      hit: { type: 'area', rings, nearPx: 8, edge: true },
      marks: edge,
    },
    { id: zone.id, layer: 'label', marks: letters ? [letters] : [] },
  ];
}

/** A ring of many vertices that are all as far from its middle within 1 %: its radius, else null. */
export function circleRadius(ring: readonly { x: number; y: number }[]): number | null {
  const corners = ring.slice(0, -1);
  if (corners.length < 12) return null;
  const middle = corners.reduce(
    (sum, v) => ({ x: sum.x + v.x / corners.length, y: sum.y + v.y / corners.length }),
    { x: 0, y: 0 },
  );
  const radii = corners.map((v) => Math.hypot(v.x - middle.x, v.y - middle.y));
  const mean = radii.reduce((sum, r) => sum + r, 0) / radii.length;
  return radii.every((r) => Math.abs(r - mean) <= mean * 0.01) ? mean : null;
}
