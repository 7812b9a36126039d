import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { applyEdit, commit, EditError, newHistory, redo, undo, type Edit } from '@/lib/edits';
import { limitsFrom } from '@/lib/limits';
import { layoutSchema, siteGroundSchema, type Piece, type Sheet } from '@/lib/layout';
import { parseExchange, writeExchange } from '@/lib/layout/exchange';
import { deepFreeze, everythingMet } from './everything';
import { dice, randomEdit, type Dice } from './random-edit';

/** Sessions of 200 edits each: 200 of them whole, a tenth with every test run. */
const SESSIONS = process.env.SOAK === '1' ? 200 : 20;
const EDITS = 200;
const session = fc.array(dice, { minLength: EDITS, maxLength: EDITS });
const TIMEOUT_MS = process.env.SOAK === '1' ? 600_000 : 60_000;
const seeded = { numRuns: SESSIONS, seed: 20310504, endOnFailure: process.env.SOAK !== '1' };

/** Edits in turn, each made for the sheet it falls on; refusals must leave no trace. */
function* played(rolls: readonly Dice[]): Generator<{ before: Sheet; edit: Edit; after: Sheet }> {
  let sheet = everythingMet();
  let ids = 0;
  for (const roll of rolls) {
    try {
      const edit = deepFreeze(randomEdit(sheet, roll, () => `n${++ids}`));
      const after = deepFreeze(applyEdit(sheet, edit));
      yield { before: sheet, edit, after };
      sheet = after;
    } catch (error) {
      if (!(error instanceof EditError)) throw error;
    }
  }
}

describe(`${SESSIONS} random sessions of ${EDITS} edits, each sheet and edit frozen`, () => {
  test(
    'undo all and redo all are byte-identical at every step',
    () => {
      fc.assert(
        fc.property(session, (rolls) => {
          let history = newHistory(everythingMet());
          const written = [JSON.stringify(history.present)];
          for (const { edit } of played(rolls)) {
            const next = commit(history, edit, edit.type);
            if (next === history) continue;
            history = next;
            written.push(JSON.stringify(history.present));
          }
          expect(written.length).toBeGreaterThan(EDITS / 2);
          for (let i = written.length - 1; i > 0; i--) {
            expect(JSON.stringify(history.present)).toBe(written[i]);
            history = undo(history);
          }
          expect(JSON.stringify(history.present)).toBe(written[0]);
          expect(history.past).toEqual([]);
          for (const text of written.slice(1)) {
            history = redo(history);
            expect(JSON.stringify(history.present)).toBe(text);
          }
          expect(history.future).toEqual([]);
        }),
        seeded,
      );
    },
    TIMEOUT_MS,
  );

  test(
    'no reference ever dangles, ids and units stay unique, every sheet is valid',
    () => {
      fc.assert(
        fc.property(session, (rolls) => {
          let step = 0;
          for (const { before, after } of played(rolls)) {
            expectJoined(after);
            if (++step % 10 === 0) expectValid(after);
            const changed = after.layout !== before.layout || after.site !== before.site;
            expect(changed).toBe(after !== before);
          }
        }),
        seeded,
      );
    },
    TIMEOUT_MS,
  );

  test(
    'what was drawn can be exported, and reads back the same',
    () => {
      fc.assert(
        fc.property(session, (rolls) => {
          const last = [...played(rolls)].at(-1)?.after ?? everythingMet();
          const file: unknown = JSON.parse(
            JSON.stringify(writeExchange({ sheet: last, limits: limitsFrom() })),
          );
          const parsed = parseExchange(file);
          expect(parsed).toMatchObject({ ok: true });
          if (!parsed.ok) return;
          expect(parsed.sheet.layout.pieces).toEqual(last.layout.pieces);
          expect(parsed.sheet.site.features).toEqual(last.site.features);
        }),
        seeded,
      );
    },
    TIMEOUT_MS,
  );
});

const UNITS = ['casualty-vehicle', 'receiving-vehicle', 'pump'];
/** Written out again here, apart from the table that the edits use. */
const FITS: Record<string, readonly [readonly string[], readonly string[]]> = {
  jumper: [['rod'], ['rod']],
  'ground-cable': [UNITS, ['rod']],
  'bond-cable': [UNITS, UNITS],
  hose: [UNITS, UNITS],
  'test-lead': [['tester'], ['z-probe', 'y-probe', 'rod']],
};

function expectValid(sheet: Sheet): void {
  expect(layoutSchema.safeParse(sheet.layout).error).toBeUndefined();
  expect(siteGroundSchema.safeParse(sheet.site).error).toBeUndefined();
}

function expectJoined(sheet: Sheet): void {
  const pieces: readonly Piece[] = [...sheet.layout.pieces, ...sheet.site.features];
  const byId = new Map(pieces.map((piece) => [piece.id, piece]));
  expect(byId.size).toBe(pieces.length);
  for (const kind of UNITS) {
    expect(pieces.filter((piece) => piece.kind === kind).length).toBeLessThanOrEqual(1);
  }
  for (const piece of pieces) {
    if (piece.kind === 'vent' && piece.of) expect(UNITS).toContain(byId.get(piece.of)?.kind);
    if (!('from' in piece)) continue;
    const [from, to] = FITS[piece.kind]!;
    expect(from).toContain(byId.get(piece.from)?.kind);
    expect(to).toContain(byId.get(piece.to)?.kind);
  }
}
