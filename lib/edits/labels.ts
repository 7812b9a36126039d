import { piecesOf, rodsOf, type Kind, type Layout, type System } from '../layout';

/** Labels are what people call pieces (C1, R2); they are given once and never used as identities. */

const numberIn = (label: string | undefined, lead: string): number => {
  if (!label?.startsWith(lead)) return 0;
  const digits = label.slice(lead.length);
  return /^[0-9]{1,6}$/.test(digits) ? Number(digits) : 0;
};

/** True for a label of the form that the product gives: the system's letter and a number. */
export const isSystemLabel = (label: string | undefined, system: System): boolean =>
  numberIn(label, system) > 0;

/** One past the highest in use, so that a label taken off the ground is not soon another rod's. */
export function nextRodLabel(layout: Layout, system: System, ahead = 0): string {
  const highest = Math.max(0, ...rodsOf(layout, system).map((rod) => numberIn(rod.label, system)));
  return `${system}${highest + 1 + ahead}`;
}

/** `lead` alone for the first piece of the kind, then numbered from 2: Z, Z2. */
export function nextLabel(layout: Layout, kind: Kind, lead: string): string {
  const taken = new Set(piecesOf(layout.pieces, kind).map((piece) => piece.label));
  if (!taken.has(lead)) return lead;
  let number = 2;
  while (taken.has(`${lead}${number}`)) number++;
  return `${lead}${number}`;
}
