import { footprintToPoint } from '../../geo';
import {
  footprintOf,
  piecesOf,
  placeOf,
  planeOf,
  rodsOf,
  unitOf,
  type PieceOf,
  type Sheet,
  type System,
} from '../../layout';
import { runBetween } from './run-between';
import type { Means } from './wanted';

/**
 * A ground cable from the system's unit to the rod nearest it, clamped where the unit comes
 * nearest; null where unit or rod is missing or a cable joins them already.
 */
export function groundCableFor(
  sheet: Sheet,
  system: System,
  { newId }: Means,
): PieceOf<'ground-cable'> | null {
  const plane = planeOf(sheet.layout);
  const unit = unitOf(sheet.layout, system);
  const rods = rodsOf(sheet.layout, system);
  const cabled = piecesOf(sheet.layout.pieces, 'ground-cable').some(
    (cable) => cable.from === unit?.id && rods.some((rod) => rod.id === cable.to),
  );
  if (!unit || rods.length === 0 || cabled) return null;
  const away = (at: number) =>
    footprintToPoint(footprintOf(plane, unit), placeOf(plane, rods[at]!));
  const nearest = rods.reduce((best, _rod, i) => (away(i) < away(best) ? i : best), 0);
  return runBetween(sheet, { id: newId(), kind: 'ground-cable', ends: [unit, rods[nearest]!] });
}
