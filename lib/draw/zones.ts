import { placesOf, type PieceOf } from '../layout';
import type { Frame } from './frame';
import { fill, line, stroke } from './marks';
import { hachures } from './ring-edge';
import type { Group } from './types';
import { lengthWords } from './words';
import { circleRadius, wordsInCircle, wordsInOutline } from './zone-words';

/** Words of the zone stand this far inside its edge. */
const WORDS_INSET_PX = 25;
const WORDS_SIZE_PX = 15;

export function drawZone(frame: Frame, zone: PieceOf<'hot-zone' | 'warm-zone'>): Group[] {
  const rings = placesOf(frame.plane, zone);
  const outer = rings[0] ?? [];
  const hot = zone.kind === 'hot-zone';
  const radius = circleRadius(outer);
  const name = hot ? 'HOT ZONE' : 'WARM ZONE';
  const size = radius === null ? '' : `, ${lengthWords(radius, frame.units, 0).toUpperCase()}`;
  const wording = {
    text: `${name}${size}`,
    size: WORDS_SIZE_PX,
    insetPx: hot ? WORDS_INSET_PX : WORDS_INSET_PX - 8,
    token: hot ? 'alarm' : 'caution',
  } as const;
  const letters =
    radius === null
      ? wordsInOutline(frame, rings, wording)
      : wordsInCircle(frame, outer, radius, wording);
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
