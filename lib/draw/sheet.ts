import type { Finding } from '../checks';
import { isRun, isUnit, type Piece } from '../layout';
import { clutterOf } from './clutter-of';
import { drawDimensions } from './dimensions';
import { drawFocus, drawRemedies } from './focus';
import { frameOf, type Frame, type FrameInput } from './frame';
import { drawGround } from './ground';
import { drawLabels } from './labels';
import { drawStatuses } from './status';
import { drawTestLines, testLines } from './test-lines';
import {
  drawNote,
  drawPool,
  drawProbe,
  drawReleasePoint,
  drawRod,
  drawTester,
  drawVent,
} from './points';
import { drawRun } from './runs';
import { LAYERS, type DisplayList, type Group } from './types';
import { drawUnit } from './units';
import { drawZone, drawZoneWords } from './zones';

export type SheetInput = FrameInput & {
  readonly findings?: readonly Finding[];
  readonly selection?: string | null;
  readonly hovered?: string | null;
};

/** The whole sheet: the site's ground with the layout on it. */
export function drawSheet(input: SheetInput): DisplayList {
  const ground = drawSite(input);
  return joined(ground, drawLayout(input, ground));
}

/** Only what the site holds: it stays while a piece is dragged, so it can be kept as a picture. */
export function drawSite(input: FrameInput): DisplayList {
  return inOrder(drawGround(frameOf(input)));
}

/** Only what the layout holds, with findings, dimensions and labels that keep off `ground`. */
export function drawLayout(input: SheetInput, ground?: DisplayList): DisplayList {
  const frame = frameOf(input);
  const { findings = [], selection = null, hovered = null } = input;
  const focus = [selection, hovered].filter((id) => id !== null);
  const tests = testLines(frame);
  const pieces = [
    ...frame.sheet.layout.pieces.flatMap((piece) => drawPiece(frame, piece)),
    ...drawTestLines(tests),
  ];
  // What is told comes before what is named: labels yield to dimensions and status shapes.
  const clutter = clutterOf(frame, pieces, ground?.groups ?? []);
  const told = [
    ...drawStatuses(frame, pieces, findings, clutter),
    ...drawRemedies(frame, findings, focus),
    ...drawDimensions(frame, { findings, focus, tests }, clutter),
  ];
  return inOrder([
    ...pieces,
    ...drawFocus(pieces, selection, hovered),
    ...told,
    ...drawZoneWords(frame, clutter),
    ...drawLabels(frame, clutter),
  ]);
}

function drawPiece(frame: Frame, piece: Piece): Group[] {
  if (isUnit(piece)) return [drawUnit(frame, piece)];
  if (isRun(piece)) return [drawRun(frame, piece)];
  switch (piece.kind) {
    case 'rod':
      return [drawRod(frame, piece)];
    case 'z-probe':
    case 'y-probe':
      return [drawProbe(frame, piece)];
    case 'tester':
      return [drawTester(frame, piece)];
    case 'release-point':
      return [drawReleasePoint(frame, piece)];
    case 'vent':
      return [drawVent(frame, piece)];
    case 'pool':
      return [drawPool(frame, piece)];
    case 'hot-zone':
    case 'warm-zone':
      return [drawZone(frame, piece)];
    case 'note':
      return [drawNote(frame, piece)];
    default:
      return [];
  }
}

/** Lists laid on each other, each layer of all of them before the next layer. */
export const joined = (...lists: readonly DisplayList[]): DisplayList =>
  inOrder(lists.flatMap((list) => list.groups));

function inOrder(groups: readonly Group[]): DisplayList {
  return { groups: LAYERS.flatMap((layer) => groups.filter((group) => group.layer === layer)) };
}
