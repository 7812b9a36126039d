import { pieceName } from '@/components/drawing/piece-words';
import type { Finding } from '@/lib/checks';
import type { LengthUnit } from '@/lib/draw';
import { feetToMetres, metresToFeet, pathLength } from '@/lib/geo';
import { isRun, placesOf, planeOf, type Sheet } from '@/lib/layout';

/** A cable, jumper, lead or hose to lay: how long it is drawn and how long it has to be. */
export type RunRow = {
  readonly id: string;
  readonly name: string;
  readonly drawn: string;
  /** With slack and climb, from the check whether the kit reaches; "–" where it did not say. */
  readonly needed: string;
};

export function runRows(sheet: Sheet, findings: readonly Finding[], units: LengthUnit): RunRow[] {
  const plane = planeOf(sheet.layout);
  const length = (metres: number): string =>
    (units === 'ft' ? metresToFeet(metres) : metres).toFixed(1);
  return sheet.layout.pieces.filter(isRun).map((run) => {
    const reach = findings.find(
      ({ rule, subjects }) => rule === 'cables-reach' && subjects.includes(run.id),
    );
    return {
      id: run.id,
      name: pieceName(sheet, run),
      drawn: length(pathLength(placesOf(plane, run)[0] ?? [])),
      needed: reach?.measured ? length(feetToMetres(reach.measured.value)) : '–',
    };
  });
}
