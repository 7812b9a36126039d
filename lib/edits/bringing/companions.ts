import {
  isUnit,
  rodsOf,
  servedBy,
  systemOfUnit,
  systemsInUse,
  type LayoutPiece,
  type Piece,
  type Rod,
  type Sheet,
  type Unit,
} from '../../layout';
import { withAdded } from '../sheet-pieces';
import { runsBetweenUnits } from './between-units';
import { groundCableFor } from './ground-cable-for';
import { jumperFor } from './jumper-for';
import { leadsFrom, testLine } from './test-line';
import type { Means } from './wanted';

/**
 * What a piece brings along, given the sheet with the piece on it. Each kind brings what joins it
 * to what is already drawn, so the order of placing doesn't matter: a casualty vehicle put down
 * first brings nothing, one put down last brings its cables.
 */
export function companions(sheet: Sheet, piece: Piece, means: Means): LayoutPiece[] {
  if (isUnit(piece)) return ofUnit(sheet, piece, means);
  switch (piece.kind) {
    case 'rod':
      return ofRod(sheet, piece, means);
    case 'z-probe':
      return testLine(sheet, servedBy(sheet.layout, piece), means);
    case 'tester': {
      const system = systemsInUse(sheet.layout).find((s) => rodsOf(sheet.layout, s).length > 0);
      const led = sheet.layout.pieces.some((other) => other.kind === 'test-lead');
      return system && !led ? leadsFrom(sheet, piece, system, means) : [];
    }
    default:
      return [];
  }
}

function ofUnit(sheet: Sheet, unit: Unit, means: Means): LayoutPiece[] {
  const cable = groundCableFor(sheet, systemOfUnit(unit), means);
  const vented = sheet.layout.pieces.some((piece) => piece.kind === 'vent');
  return [
    ...(unit.kind === 'receiving-vehicle' && !vented
      ? [{ id: means.newId(), kind: 'vent' as const, at: unit.at, of: unit.id }]
      : []),
    ...runsBetweenUnits(sheet, unit, means),
    ...(cable ? [cable] : []),
  ];
}

function ofRod(sheet: Sheet, rod: Rod, means: Means): LayoutPiece[] {
  const jumper = jumperFor(sheet, rod, means);
  const joined = jumper ? withAdded(sheet, [jumper]) : sheet;
  const cable = groundCableFor(joined, rod.system, means);
  const first = rodsOf(sheet.layout, rod.system).length === 1;
  return [
    ...(jumper ? [jumper] : []),
    ...(cable ? [cable] : []),
    ...(first ? testLine(sheet, [rod.system], means) : []),
  ];
}
