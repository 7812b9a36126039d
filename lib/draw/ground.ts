import { feetToMetres, type Vec } from '../geo';
import { OVERHEAD_CLEARANCE, overheadClearanceFeet } from '../limits';
import { piecesOf, placesOf, type PieceOf, type SiteFeature } from '../layout';
import { drawBuriedLines } from './buried-lines';
import type { Frame } from './frame';
import { hatch } from './hatch';
import { wordsAlong } from './line-words';
import { fill, line, stroke } from './marks';
import { drawFixedPoint } from './points';
import type { Group, Mark } from './types';

/** Everything the site holds, lowest first. */
export function drawGround(frame: Frame): Group[] {
  const { features } = frame.sheet.site;
  return [
    ...piecesOf(features, 'low-ground').map((area) => lowGround(frame, area)),
    ...piecesOf(features, 'no-drive').map((area) => noDrive(frame, area)),
    ...drawBuriedLines(frame, piecesOf(features, 'buried-line')),
    ...piecesOf(features, 'metal-line').map((metal) => metalLine(frame, metal)),
    ...piecesOf(features, 'overhead-line').map((overhead) => overheadLine(frame, overhead)),
    ...piecesOf(features, 'fixed-point').map((point) => drawFixedPoint(frame, point)),
  ];
}

function noDrive(frame: Frame, area: PieceOf<'no-drive'>): Group {
  const rings = placesOf(frame.plane, area);
  return areaGroup(area, rings, [
    line(hatch(frame, rings, 45, 14), stroke('rule', 0.9)),
    line(rings, stroke('rule', 1.25), true),
  ]);
}

/** Level strokes, as maps draw wet ground. */
function lowGround(frame: Frame, area: PieceOf<'low-ground'>): Group {
  const rings = placesOf(frame.plane, area);
  return areaGroup(area, rings, [
    line(hatch(frame, rings, 0, 8), stroke('water-low', 1, { dash: [10, 6, 4, 6] })),
    line(
      rings,
      stroke('water-low', 1.25, { dash: [4, 3] }),
      true,
      fill('water-low', frame.inkOnly ? 0 : 0.06),
    ),
  ]);
}

const TIES: Readonly<Record<NonNullable<PieceOf<'metal-line'>['what']>, string>> = {
  rail: 'RAIL',
  guardrail: 'GUARDRAIL',
  fence: 'FENCE',
  culvert: 'CULVERT',
};

function metalLine(frame: Frame, metal: PieceOf<'metal-line'>): Group {
  const path = placesOf(frame.plane, metal)[0] ?? [];
  const look =
    metal.what === 'rail'
      ? [stroke('steel', 6, { dash: [1.5, 9] }), stroke('steel', 2)]
      : metal.what === 'culvert'
        ? [stroke('paper', 3, { casing: { token: 'steel', width: 6 } })]
        : [stroke('steel', 1.75), stroke('steel', 6, { dash: [1.5, 14] })];
  return {
    id: metal.id,
    layer: 'ground',
    hit: { type: 'lines', lines: [path], nearPx: 7 },
    marks: [
      ...look.map((drawn) => line([path], drawn)),
      ...wordsAlong(frame, path, metal.what ? TIES[metal.what] : 'METAL', 'steel'),
    ],
  };
}

/** The wires as a dash-dot line, the ground to keep clear of as a band on each side. */
function overheadLine(frame: Frame, overhead: PieceOf<'overhead-line'>): Group {
  const path = placesOf(frame.plane, overhead)[0] ?? [];
  const known = overhead.volts === undefined ? null : overheadClearanceFeet(overhead.volts);
  const clear = known ?? OVERHEAD_CLEARANCE.unknownDrawnFeet;
  const volts = overhead.volts === undefined ? 'VOLTAGE NOT KNOWN' : voltWords(overhead.volts);
  return {
    id: overhead.id,
    layer: 'ground',
    hit: { type: 'lines', lines: [path], nearPx: 7 },
    marks: [
      line([path], stroke('ink', 1, { widthMetres: feetToMetres(clear) * 2, opacity: 0.07 })),
      line([path], stroke('ink', 1.75, { dash: [16, 4, 3, 4, 3, 4] })),
      ...wordsAlong(frame, path, `OVERHEAD, ${volts}`, 'ink'),
    ],
  };
}

const voltWords = (volts: number): string =>
  volts >= 1000 ? `${Number((volts / 1000).toFixed(1))} kV` : `${volts} V`;

const areaGroup = (
  area: SiteFeature,
  rings: readonly (readonly Vec[])[],
  marks: Mark[],
): Group => ({
  id: area.id,
  layer: 'ground',
  hit: { type: 'area', rings, nearPx: 6, edge: true },
  marks,
});
