import { feetToMetres, type LonLat } from '../../geo';
import {
  piecesOf,
  placeOf,
  planeOf,
  pumpIsSeparate,
  systemOfUnit,
  unitOf,
  type PieceOf,
  type Run,
  type Sheet,
  type System,
  type Unit,
} from '../../layout';
import { hoseFromKit } from './from-kit';
import { runBetween } from './run-between';
import type { Means } from './wanted';

/** A bond and a hose between the same units start this far to either side, so both can be seen. */
const ASIDE_FT = 4;

type Pair = readonly [System, System];

/** A bond from one system's unit to another's; null where one isn't drawn or a bond joins them. */
export function bondFor(
  sheet: Sheet,
  [one, other]: Pair,
  { newId }: Means,
): PieceOf<'bond-cable'> | null {
  const units = unjoined(sheet, 'bond-cable', [one, other]);
  return units && { ...beside(sheet, 'bond-cable', units, ASIDE_FT, newId()) };
}

/** A hose between two units, of the diameter the kit has; null as for a bond. */
export function hoseFor(sheet: Sheet, pair: Pair, { newId }: Means): PieceOf<'hose'> | null {
  const units = unjoined(sheet, 'hose', pair);
  return (
    units && { ...beside(sheet, 'hose', units, -ASIDE_FT, newId()), ...hoseFromKit(sheet.layout) }
  );
}

/** The bonds and hoses that a unit just put down makes possible, given the others drawn. */
export function runsBetweenUnits(sheet: Sheet, unit: Unit, means: Means): Run[] {
  const system = systemOfUnit(unit);
  const separate = pumpIsSeparate(sheet.layout);
  const hoses: Pair[] = separate ? [['C', 'P'], ['P', 'R']] : [['C', 'R']]; // prettier-ignore
  const bonds: Pair[] = separate ? [['C', 'R'], ['C', 'P']] : [['C', 'R']]; // prettier-ignore
  const ours = (pair: Pair): boolean => pair.includes(system);
  return [
    ...hoses.filter(ours).map((pair) => hoseFor(sheet, pair, means)),
    ...bonds.filter(ours).map((pair) => bondFor(sheet, pair, means)),
  ].filter((run) => run !== null);
}

function unjoined(sheet: Sheet, kind: 'bond-cable' | 'hose', pair: Pair): [Unit, Unit] | null {
  const one = unitOf(sheet.layout, pair[0]);
  const other = unitOf(sheet.layout, pair[1]);
  if (!one || !other) return null;
  const joined = piecesOf(sheet.layout.pieces, kind).some(
    ({ from, to }) => (from === one.id && to === other.id) || (from === other.id && to === one.id),
  );
  return joined ? null : [one, other];
}

function beside<K extends 'bond-cable' | 'hose'>(
  sheet: Sheet,
  kind: K,
  units: readonly [Unit, Unit],
  asideFt: number,
  id: string,
): PieceOf<K> {
  const plane = planeOf(sheet.layout);
  const [a, b] = [placeOf(plane, units[0]), placeOf(plane, units[1])];
  const length = Math.hypot(b.x - a.x, b.y - a.y) || 1;
  const aside = feetToMetres(asideFt) / length;
  const [dx, dy] = [(b.y - a.y) * aside, (a.x - b.x) * aside];
  const past = (v: { x: number; y: number }): LonLat =>
    plane.toLonLat({ x: v.x + dx, y: v.y + dy });
  return runBetween(sheet, { id, kind, ends: units, towards: [past(b), past(a)] });
}
