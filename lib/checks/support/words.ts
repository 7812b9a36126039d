import { findPiece, nameOf, UNIT_WORDS, type Sheet, type System } from '../../layout';

/** How findings say numbers and names. Values in findings stay unrounded; only words round. */
export const feet = (value: number): string => `${value.toFixed(1)} ft`;
export const degrees = (value: number): string => `${Math.round(value)}°`;

/** A limit that was missed, beside its value: with the decimals it takes to tell them apart. */
export const feetBeside = (limit: number, value: number): string =>
  `${value.toFixed(decimalsToTell(value, limit, 1))} ft`;
export const degreesBeside = (limit: number, value: number): string =>
  `${value.toFixed(decimalsToTell(value, limit, 0))}°`;

const MOST_DECIMALS = 3;

function decimalsToTell(value: number, limit: number, least: number): number {
  let decimals = least;
  while (decimals < MOST_DECIMALS && value.toFixed(decimals) === limit.toFixed(decimals))
    decimals++;
  return decimals;
}
export const ratio = (value: number): string => value.toFixed(2);

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

export const systemWords = (system: System): string => `system ${system}`;
export const unitWords = (system: System): string => `the ${UNIT_WORDS[system]}`;

export function nameById(sheet: Sheet, id: string): string {
  const piece = findPiece(sheet, id);
  return piece ? nameOf(piece) : id;
}

/** Why a rule does not apply to system P or to a pump drawn all the same. */
export const NOT_IN_USE = 'The pump stands on the receiving vehicle or there is none';
