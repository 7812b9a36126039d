import { placesOf, type PieceOf, type Probe, type Rod } from '../layout';
import type { Frame } from './frame';
import { fill, glyph, line, pxDisc, pxLine, scaled, stroke } from './marks';
import type { Group, PxShape } from './types';

/** Pieces that stand on a spot: fixed symbols, whatever the scale. */

export const ROD_RADIUS_PX = 7.5;
export const Z_RADIUS_PX = 14;
export const Y_RADIUS_PX = 10.5;
const FINGER_PX = 12;

export function drawRod(frame: Frame, rod: Rod): Group {
  return spot(frame, rod, ROD_RADIUS_PX, [
    pxDisc(ROD_RADIUS_PX + 1.5, null, fill('paper')),
    pxDisc(ROD_RADIUS_PX, null, fill('ink')),
    pxLine(
      [
        [-4.25, 0],
        [4.25, 0],
      ],
      stroke('paper', 1.5),
    ),
    pxLine(
      [
        [0, -4.25],
        [0, 4.25],
      ],
      stroke('paper', 1.5),
    ),
  ]);
}

/** An open ring with a T bar, as the probe's own handle looks from above. */
export function drawProbe(frame: Frame, probe: Probe): Group {
  const r = probe.kind === 'z-probe' ? Z_RADIUS_PX : Y_RADIUS_PX;
  const width = probe.kind === 'z-probe' ? 2 : 1.75;
  return spot(frame, probe, r, [
    pxDisc(r, stroke('ink', width), fill('paper')),
    pxLine(
      [
        [-r * 0.5, -r * 0.42],
        [r * 0.5, -r * 0.42],
      ],
      stroke('ink', width),
    ),
    pxLine(
      [
        [0, -r * 0.42],
        [0, r * 0.56],
      ],
      stroke('ink', width),
    ),
  ]);
}

/** A box with the meter's scale. */
export function drawTester(frame: Frame, tester: PieceOf<'tester'>): Group {
  return spot(frame, tester, 11, [
    pxLine(
      [
        [-11, -8],
        [11, -8],
        [11, 8],
        [-11, 8],
      ],
      stroke('ink', 2),
      true,
      fill('paper'),
    ),
    pxLine(
      [
        [-5.5, 3.5],
        [-4.6, 0.4],
        [-2.4, -1.9],
        [0, -2.6],
        [2.4, -1.9],
        [4.6, 0.4],
        [5.5, 3.5],
        [-5.5, 3.5],
      ],
      stroke('ink', 1.5),
    ),
  ]);
}

export function drawReleasePoint(frame: Frame, release: PieceOf<'release-point'>): Group {
  return spot(frame, release, 10, [pxLine(DROP, stroke('paper', 2), true, fill('alarm'))]);
}

/** An open pipe end with vapour leaving it. */
export function drawVent(frame: Frame, vent: PieceOf<'vent'>): Group {
  return spot(frame, vent, 9, [
    pxDisc(8.5, stroke('alarm', 1.75), fill('paper')),
    pxLine(
      [
        [-4.5, 2.5],
        [0, -4],
        [4.5, 2.5],
      ],
      stroke('alarm', 1.75),
    ),
    pxLine(
      [
        [-4.5, 5],
        [4.5, 5],
      ],
      stroke('alarm', 1.5),
    ),
  ]);
}

export function drawFixedPoint(frame: Frame, point: PieceOf<'fixed-point'>): Group {
  return {
    ...spot(frame, point, 7, [
      pxLine(
        [
          [-9, 0],
          [9, 0],
        ],
        stroke('ink', 1.5),
      ),
      pxLine(
        [
          [0, -9],
          [0, 9],
        ],
        stroke('ink', 1.5),
      ),
      pxDisc(5.5, stroke('ink', 1.75), fill('paper')),
    ]),
  };
}

export function drawNote(frame: Frame, note: PieceOf<'note'>): Group {
  return spot(frame, note, 7, [
    pxLine(
      [
        [-6, -6],
        [6, -6],
        [6, 3],
        [3, 6],
        [-6, 6],
      ],
      stroke('ink', 1.5),
      true,
      fill('paper'),
    ),
    pxLine(
      [
        [-3, -2.5],
        [3, -2.5],
      ],
      stroke('ink', 1.25),
    ),
    pxLine(
      [
        [-3, 1],
        [1.5, 1],
      ],
      stroke('ink', 1.25),
    ),
  ]);
}

export function drawPool(frame: Frame, pool: PieceOf<'pool'>): Group {
  const rings = placesOf(frame.plane, pool);
  return {
    id: pool.id,
    layer: 'zone',
    hit: { type: 'area', rings, nearPx: 6, edge: false },
    marks: [
      line(rings, stroke('alarm', 1.75, { dash: [2, 3], cap: 'round' }), true, fill('alarm', 0.16)),
    ],
  };
}

const spot = (
  frame: Frame,
  piece: Rod | Probe | PieceOf<'tester' | 'release-point' | 'vent' | 'fixed-point' | 'note'>,
  radius: number,
  shapes: readonly PxShape[],
): Group => {
  const at = frame.vec(piece.at);
  return {
    id: piece.id,
    layer: 'piece',
    hit: { type: 'spot', at, radiusPx: Math.max(radius, FINGER_PX) * frame.symbols },
    marks: [glyph(at, scaled(shapes, frame.symbols))],
  };
};

/** A drop with its tip up, drawn round its place. */
const DROP: readonly (readonly [number, number])[] = [
  [0, -11],
  ...Array.from({ length: 13 }, (_, i): readonly [number, number] => {
    const angle = ((-20 + (i * 220) / 12) * Math.PI) / 180;
    return [6.2 * Math.cos(angle), 3 + 6.2 * Math.sin(angle)];
  }),
];
