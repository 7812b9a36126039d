import { PIECE_DEFAULTS } from '@/lib/limits';
import {
  isUnit,
  piecesOf,
  rodLengthFt,
  unitSizeFt,
  UTILITIES,
  type Layout,
  type Piece,
} from '@/lib/layout';

/** One editable fact of a piece: its member, what it is called, how it is entered. */
export type Fact = { readonly member: string; readonly label: string } & (
  | {
      readonly type: 'number';
      readonly unit: 'ft' | 'in' | '°' | 'V';
      readonly least: number;
      readonly most: number;
      /** What is taken while nothing is entered. */
      readonly standsFor?: number;
    }
  | { readonly type: 'text'; readonly most: number }
  | {
      readonly type: 'choice';
      readonly choices: readonly { readonly value: string; readonly words: string }[];
      /** What leaving it open means; absent where one must be chosen. */
      readonly open?: string;
    }
  | { readonly type: 'flag' }
  | { readonly type: 'systems' }
);

const words = (values: readonly string[]) =>
  values.map((value) => ({ value, words: value.replaceAll('-', ' ') }));

const feet = (member: string, label: string, most: number, standsFor?: number): Fact => ({
  member,
  label,
  type: 'number',
  unit: 'ft',
  least: 0,
  most,
  standsFor,
});
const inches = (member: string, label: string, most: number, standsFor?: number): Fact => ({
  ...feet(member, label, most, standsFor),
  type: 'number',
  unit: 'in',
  least: 0,
  most,
  standsFor,
});

const LABEL: Fact = { member: 'label', label: 'Label', type: 'text', most: 60 };
const SURFACE: Fact = { member: 'surface', label: 'Surface', type: 'text', most: 500 };

const QUALITY = [
  { value: 'A', words: 'A, exposed and measured' },
  { value: 'B', words: 'B, found by geophysics' },
  { value: 'C', words: 'C, surface features surveyed' },
  { value: 'D', words: 'D, records or recollection' },
];

/** What a stake tag asks of a piece, most wanted first. */
export function factsOf(piece: Piece, layout: Layout): Fact[] {
  if (isUnit(piece)) {
    const size = unitSizeFt({ ...piece, length_ft: undefined, width_ft: undefined });
    return [
      { member: 'heading_deg', label: 'Heading', type: 'number', unit: '°', least: 0, most: 360 },
      feet('length_ft', 'Length', 300, size.length),
      feet('width_ft', 'Width', 60, size.width),
    ];
  }
  switch (piece.kind) {
    case 'rod':
      return [
        LABEL,
        { member: 'system', label: 'System', type: 'choice', choices: words(['C', 'R', 'P']) },
        feet('length_ft', 'Length', 200, PIECE_DEFAULTS.rod.length_ft),
        feet('driven_ft', 'Driven', 200, rodLengthFt(piece)),
        inches('diameter_in', 'Diameter', 12, PIECE_DEFAULTS.rod.diameter_in),
      ];
    case 'z-probe':
    case 'y-probe':
      return [{ member: 'serves', label: 'Serves', type: 'systems' }];
    case 'hose':
      return [inches('diameter_in', 'Diameter', 240)];
    case 'vent':
      return [
        {
          member: 'of',
          label: 'Vent of',
          type: 'choice',
          choices: piecesOf(layout.pieces, 'receiving-vehicle', 'casualty-vehicle', 'pump').map(
            ({ id, kind }) => ({ value: id, words: kind.replaceAll('-', ' ') }),
          ),
          open: 'not said',
        },
      ];
    case 'note':
      return [{ member: 'text', label: 'Note', type: 'text', most: 2000 }];
    case 'no-drive':
    case 'low-ground':
      return [SURFACE];
    case 'fixed-point':
      return [{ member: 'name', label: 'Name', type: 'text', most: 500 }];
    case 'metal-line':
      return [
        {
          member: 'what',
          label: 'What',
          type: 'choice',
          choices: words(['rail', 'guardrail', 'fence', 'culvert']),
          open: 'not said',
        },
      ];
    case 'overhead-line':
      return [
        { member: 'volts', label: 'Voltage', type: 'number', unit: 'V', least: 0, most: 2_000_000 },
      ];
    case 'buried-line':
      return [
        { member: 'utility', label: 'Class', type: 'choice', choices: words(UTILITIES) },
        {
          member: 'quality',
          label: 'Quality',
          type: 'choice',
          choices: QUALITY,
          open: 'D, not said',
        },
        inches('diameter_in', 'Diameter', 240),
        feet('depth_ft', 'Depth', 500),
        {
          member: 'material',
          label: 'Material',
          type: 'choice',
          choices: words(['metal', 'nonmetal', 'unknown']),
          open: 'unknown, not said',
        },
        { member: 'private', label: 'Private line', type: 'flag' },
        { member: 'owner', label: 'Owner', type: 'text', most: 500 },
      ];
    case 'tester':
    case 'release-point':
      return [LABEL];
    default:
      return [];
  }
}
