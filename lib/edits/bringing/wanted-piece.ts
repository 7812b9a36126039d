import type { LonLat } from '../../geo';
import { AREA_DRAWN_RADIUS_FT } from '../../limits';
import {
  findPiece,
  isUnit,
  placeKey,
  planeOf,
  type Kind,
  type Layout,
  type Piece,
  type Run,
  type Sheet,
  type System,
} from '../../layout';
import { ENDS } from '../../layout/exchange/references';
import { nextRodLabel } from '../labels';
import { KIND_WORDS } from '../piece-words';
import { EditError } from '../types';
import { standsOn } from '../unit-frame';
import { circleRing } from '../zone';
import { hoseFromKit, rodFromKit } from './from-kit';
import { runBetween } from './run-between';
import { systemFor } from './system-piece';
import { systemToServe } from './system-to-serve';
import { limitsOf, type Means, type Wanted } from './wanted';

/**
 * The piece itself, with what the sheet and the kit say of it where the reader didn't. The edit
 * that places it checks every member, so nothing is checked here.
 */
export function wantedPiece(sheet: Sheet, wanted: Wanted, means: Means): Piece {
  const id = means.newId();
  const members = { ...implied(sheet, wanted, means), ...wanted.members };
  const { kind } = wanted;
  if (isRunKind(kind)) return { ...wantedRun(sheet, wanted, kind, id), ...members };
  return { id, kind, ...geometry(sheet.layout, wanted), ...members } as Piece;
}

const isRunKind = (kind: Kind): kind is Run['kind'] => kind in ENDS;

function geometry(layout: Layout, { kind, places, radiusFt }: Wanted): Record<string, unknown> {
  const [first] = places;
  if (!first) throw new EditError(`Nobody said where the ${KIND_WORDS[kind]} goes.`);
  switch (placeKey(kind)) {
    case 'at':
      return { at: first };
    case 'path':
      return { path: places };
    case 'paths':
      return { paths: [places] };
    case 'rings':
      return {
        rings: [places.length > 1 ? [...places, first] : circle(layout, kind, first, radiusFt)],
      };
  }
}

function circle(layout: Layout, kind: Kind, centre: LonLat, radiusFt?: number): LonLat[] {
  const byDefault: Partial<Record<Kind, number>> = AREA_DRAWN_RADIUS_FT;
  return circleRing(layout, centre, radiusFt ?? byDefault[kind] ?? AREA_DRAWN_RADIUS_FT.pool);
}

function wantedRun(sheet: Sheet, wanted: Wanted, kind: Run['kind'], id: string): Run {
  const [one, other] = (wanted.ends ?? []).map((end) => findPiece(sheet, end));
  if (!one || !other) {
    throw new EditError(
      `A ${KIND_WORDS[kind]} runs from one piece to another. Choose the two pieces it joins.`,
    );
  }
  const [from, to] = [wanted.places[0], wanted.places.at(-1)];
  return runBetween(sheet, {
    id,
    kind,
    ends: [one, other],
    via: wanted.places.slice(1, -1),
    ...(from && to && { towards: [from, to] as const }),
  });
}

/** Members that follow from where the piece is put and what else is drawn. */
function implied(sheet: Sheet, wanted: Wanted, means: Means): Record<string, unknown> {
  const { layout } = sheet;
  const [at] = wanted.places;
  if (!at) return {};
  switch (wanted.kind) {
    case 'rod': {
      const asked = wanted.members?.system as System | undefined;
      const system = asked ?? systemFor(layout, at, limitsOf(means));
      return { system, label: nextRodLabel(layout, system), ...rodFromKit(layout) };
    }
    case 'y-probe': {
      const system = systemToServe(sheet, at);
      return system ? { serves: [system] } : {};
    }
    case 'vent': {
      const plane = planeOf(layout);
      const unit = layout.pieces.find((piece) => isUnit(piece) && standsOn(plane, piece, at));
      return unit ? { of: unit.id } : {};
    }
    case 'hose':
      return hoseFromKit(layout);
    default:
      return {};
  }
}
