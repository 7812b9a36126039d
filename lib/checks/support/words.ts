import { findPiece, nameOf, UNIT_WORDS, type Sheet, type System } from '../../layout';

/** How findings say numbers and names. Values in findings stay unrounded; only words round. */
export const feet = (value: number): string => `${value.toFixed(1)} ft`;
export const degrees = (value: number): string => `${Math.round(value)}°`;
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
