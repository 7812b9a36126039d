import { piecesOf, placesOf, type PieceOf } from '../layout';
import type { Clutter } from './clutter';
import { addWords } from './clutter-of';
import type { Frame } from './frame';
import { fill, line, stroke } from './marks';
import { hachures } from './ring-edge';
import type { Group } from './types';
import { lengthWords } from './words';
import { circleRadius, wordsInCircle, wordsInOutline } from './zone-words';

type Zone = PieceOf<'hot-zone' | 'warm-zone'>;

/** Words of the zone stand this far inside its edge. */
const WORDS_INSET_PX = 25;
const WORDS_SIZE_PX = 15;

export function drawZone(frame: Frame, zone: Zone): Group {
  const rings = placesOf(frame.plane, zone);
  const marks =
    zone.kind === 'hot-zone'
      ? [
          line(rings, stroke('alarm', 2.25), true, fill('alarm', frame.inkOnly ? 0 : 0.05)),
          line(hachures(frame, rings), stroke('alarm', 1.5)),
        ]
      : [line(rings, stroke('caution', 1.75, { dash: [12, 6] }), true)];
  return {
    id: zone.id,
    layer: 'zone',
    hit: { type: 'area', rings, nearPx: 8, edge: true },
    marks,
  };
}

/** "HOT ZONE, 45 FT" along the inside of each zone's edge, where it covers least. */
export function drawZoneWords(frame: Frame, clutter: Clutter): Group[] {
  return piecesOf(frame.sheet.layout.pieces, 'hot-zone', 'warm-zone').flatMap((zone) => {
    const rings = placesOf(frame.plane, zone);
    const radius = circleRadius(rings[0] ?? []);
    const hot = zone.kind === 'hot-zone';
    const size = radius === null ? '' : `, ${lengthWords(radius, frame.units, 0).toUpperCase()}`;
    const wording = {
      text: `${hot ? 'HOT ZONE' : 'WARM ZONE'}${size}`,
      size: WORDS_SIZE_PX,
      insetPx: hot ? WORDS_INSET_PX : WORDS_INSET_PX - 8,
      token: hot ? 'alarm' : 'caution',
    } as const;
    const mark =
      radius === null
        ? wordsInOutline(frame, rings, wording, clutter)
        : wordsInCircle(frame, rings[0] ?? [], radius, wording, clutter);
    if (!mark) return [];
    addWords(clutter, mark);
    return [{ id: zone.id, layer: 'label' as const, marks: [mark] }];
  });
}
