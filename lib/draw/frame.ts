import { feetToMetres, type LocalPlane, type LonLat, type Vec } from '../geo';
import type { Limits } from '../limits';
import { planeOf, type Sheet } from '../layout';
import type { LengthUnit, View } from './types';

/** Scale used where nobody says for which the list is drawn: about a letter sheet at 1 in = 20 ft. */
const DEFAULT_VIEW: View = { metresPerPx: 0.0635 };

/** From so many px a foot on, symbols have their full size; below they shrink to this part. */
const FULL_FROM_PX = 2.8;
const LEAST_SYMBOLS = 0.65;

/** What every part of the drawing is drawn from. */
export type Frame = {
  readonly sheet: Sheet;
  readonly limits: Limits;
  readonly plane: LocalPlane;
  readonly view: View;
  readonly units: LengthUnit;
  /** One ink on paper: what colour tells on a screen is told by dash and fuller words. */
  readonly inkOnly: boolean;
  vec(place: LonLat): Vec;
  /** Metres on the ground that `px` cover. */
  metres(px: number): number;
  /** Symbols are drawn this part of their size: smaller where the sheet is seen from far off. */
  readonly symbols: number;
};

export type FrameInput = {
  readonly sheet: Sheet;
  readonly limits: Limits;
  readonly units?: LengthUnit;
  readonly inkOnly?: boolean;
  readonly view?: View;
};

export function frameOf({ sheet, limits, units, inkOnly, view = DEFAULT_VIEW }: FrameInput): Frame {
  const plane = planeOf(sheet.layout);
  return {
    sheet,
    limits,
    plane,
    view,
    units: units ?? 'ft',
    inkOnly: inkOnly ?? false,
    vec: plane.toPlane,
    metres: (px) => px * view.metresPerPx,
    symbols: Math.min(
      1,
      Math.max(LEAST_SYMBOLS, feetToMetres(1) / view.metresPerPx / FULL_FROM_PX),
    ),
  };
}
