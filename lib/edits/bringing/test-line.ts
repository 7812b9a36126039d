import { meanOf, quantise, type LonLat, type Vec } from '../../geo';
import { TRUE_POINT_RATIO } from '../../limits';
import {
  piecesOf,
  placeOf,
  planeOf,
  probeFor,
  rodsOf,
  type LayoutPiece,
  type PieceOf,
  type Rod,
  type Sheet,
  type System,
} from '../../layout';
import { withAdded } from '../sheet-pieces';
import { runBetween } from './run-between';
import { nearestRod } from './system-piece';
import { testerBeside } from './tester-beside';
import type { Means } from './wanted';

/** Where a system's Y reads true: 0.618 of the way from its centre to its Z; null without either. */
export function truePoint(sheet: Sheet, system: System): LonLat | null {
  const plane = planeOf(sheet.layout);
  const centre = centreOf(sheet, system);
  const probe = probeFor(sheet.layout, 'z-probe', system);
  if (!centre || !probe) return null;
  const z = placeOf(plane, probe);
  const part = TRUE_POINT_RATIO.value;
  return quantise(
    plane.toLonLat({
      x: centre.x + (z.x - centre.x) * part,
      y: centre.y + (z.y - centre.y) * part,
    }),
  );
}

export function centreOf(sheet: Sheet, system: System): Vec | null {
  const plane = planeOf(sheet.layout);
  return meanOf(rodsOf(sheet.layout, system).map((rod) => placeOf(plane, rod)));
}

/**
 * What the test lines of these systems still lack: a Y for each at its true point, one tester
 * beside the first system's rods, and the leads from it to that system's rod, Y and Z. The meter
 * reads one system at a time with the same leads, so they are drawn for one.
 */
export function testLine(sheet: Sheet, systems: readonly System[], means: Means): LayoutPiece[] {
  const ready = systems.filter((system) => truePoint(sheet, system) !== null);
  const [first] = ready;
  if (!first) return [];
  const probes = ready
    .filter((system) => !probeFor(sheet.layout, 'y-probe', system))
    .map((system) => yProbe(sheet, system, means));
  const tested = piecesOf(sheet.layout.pieces, 'tester').length > 0;
  if (tested) return probes;
  const tester: PieceOf<'tester'> = {
    id: means.newId(),
    kind: 'tester',
    at: testerBeside(sheet, first, means),
  };
  const drawn = withAdded(sheet, [...probes, tester]);
  return [...probes, tester, ...leadsFrom(drawn, tester, first, means)];
}

const yProbe = (sheet: Sheet, system: System, { newId }: Means): PieceOf<'y-probe'> => ({
  id: newId(),
  kind: 'y-probe',
  at: truePoint(sheet, system)!,
  serves: [system],
});

/** Leads from the tester to the nearest rod of the system, its Y and its Z, as far as drawn. */
export function leadsFrom(
  sheet: Sheet,
  tester: PieceOf<'tester'>,
  system: System,
  { newId }: Means,
): PieceOf<'test-lead'>[] {
  const rods: Rod[] = rodsOf(sheet.layout, system);
  const ends = [
    nearestRod(sheet.layout, rods, tester.at)?.rod,
    probeFor(sheet.layout, 'y-probe', system),
    probeFor(sheet.layout, 'z-probe', system),
  ];
  return ends
    .filter((end) => end !== null && end !== undefined)
    .map((end) => runBetween(sheet, { id: newId(), kind: 'test-lead', ends: [tester, end] }));
}
