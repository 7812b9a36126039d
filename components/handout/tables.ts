import { CAUTION_WORDS, FIELD_CAUTION_WORDS } from '@/components/ui/caution';
import { STATUS_WORDS } from '@/components/ui/status';
import type { LengthUnit } from '@/lib/draw';
import { piecesOf, systemsInUse } from '@/lib/layout';
import type { Blank } from './blanks';
import { checkParts } from './check-rows';
import type { HandoutInput } from './handout-input';
import type { PaperTable } from './paper-table';
import { positionsOf } from './positions';
import { runRows } from './run-rows';

/** Everything behind the plan, in the order in which it is needed. */
export function tablesOf(
  input: HandoutInput,
  blanks: readonly Blank[],
  units: LengthUnit,
): PaperTable[] {
  return [
    positionsTable(input, units),
    runsTable(input, units),
    readingsTable(input, units),
    blanksTable(blanks),
    ...checksTables(input, blanks),
    notesTable(input),
    cautionsTable(),
  ].filter(({ rows }) => rows.length > 0);
}

function positionsTable({ sheet }: HandoutInput, units: LengthUnit): PaperTable {
  const { from, zero, rows } = positionsOf(sheet, units);
  return {
    id: 'positions',
    title: 'Where each piece stands',
    lead:
      `Bearings are from true north, distances in ${units === 'ft' ? 'feet' : 'metres'}, ` +
      `counted from the ${zero}.` +
      (from.length > 0 ? ' Two tape distances place a piece without going near the casualty.' : ''),
    columns: [
      { title: 'Piece', share: 16 },
      { title: 'What', share: 24 },
      { title: 'Bearing', share: 9, right: true },
      { title: `Distance, ${units}`, share: 10, right: true },
      { title: `East and north, ${units}`, share: 18, right: true },
      ...from.map((name) => ({ title: `Tape from ${name}`, share: 13, right: true })),
    ],
    rows: rows.map((row) => ({
      key: row.id,
      cells: [
        { text: row.name, strong: true },
        { text: row.what },
        { text: row.bearing ?? '–' },
        { text: row.reach ?? '–' },
        { text: row.eastNorth },
        ...row.taped.map((text) => ({ text })),
      ],
    })),
  };
}

const runsTable = ({ sheet, findings }: HandoutInput, units: LengthUnit): PaperTable => ({
  id: 'runs',
  title: 'What is laid between them',
  columns: [
    { title: 'Run', share: 60 },
    { title: `Drawn, ${units}`, share: 15, right: true },
    { title: `Needed with slack and climb, ${units}`, share: 25, right: true },
  ],
  rows: runRows(sheet, findings, units).map(({ id, name, drawn, needed }) => ({
    key: id,
    cells: [{ text: name }, { text: drawn }, { text: needed, strong: true }],
  })),
});

/** Filled in by the scribe: three positions of Y for each system. */
function readingsTable({ sheet, limits }: HandoutInput, units: LengthUnit): PaperTable {
  const columns = [
    'System',
    `Z, ${units}`,
    `Y, ${units}`,
    'Reading, Ω',
    `Y nearer, ${units}`,
    'Reading, Ω',
    `Y farther, ${units}`,
    'Reading, Ω',
    'Time',
    'Read by',
  ];
  const accept = limits.acceptance
    ? `Accepted below ${limits.acceptance.max_ohm} Ω, and lower is better.`
    : 'The value to accept below is not set.';
  return {
    id: 'readings',
    title: 'Readings',
    lead: `Each system alone, before anything is connected to it. ${accept}`,
    columns: columns.map((title) => ({ title, share: 1 })),
    rowMm: 9.5,
    rows: systemsInUse(sheet.layout).map((system) => ({
      key: system,
      cells: columns.map((_, i) => ({ text: i === 0 ? system : '', strong: i === 0 })),
    })),
  };
}

const blanksTable = (blanks: readonly Blank[]): PaperTable => ({
  id: 'blanks',
  title: 'Not known: to be filled in',
  lead: 'What is not known can be the deadliest. Fill in each, enter it, and check again.',
  columns: [
    { title: 'Blank', share: 7 },
    { title: 'What to find out', share: 93 },
  ],
  rowMm: 9,
  rows: blanks.map(({ number, form }) => ({
    key: String(number),
    cells: [
      { text: String(number), strong: true },
      { text: form, form: true },
    ],
  })),
});

const checksTables = (
  { sheet, findings, agencyName }: HandoutInput,
  blanks: readonly Blank[],
): PaperTable[] =>
  checkParts(sheet, findings, blanks).map(({ question, lines }, i) => ({
    id: `checks-${i}`,
    title: question,
    ...(i === 0 && { lead: `Judged by the limits set by ${agencyName}.` }),
    columns: [
      { title: 'Answer', share: 12 },
      { title: 'Check', share: 48 },
      { title: 'Measured', share: 12, right: true },
      { title: 'Allowed', share: 12, right: true },
      { title: 'At approval', share: 18 },
    ],
    rows: lines.map(({ key, status, words, measured, allowed, asks }) => ({
      key,
      cells: [
        { text: STATUS_WORDS[status], status },
        { text: words },
        { text: measured, strong: status !== 'meets' },
        { text: allowed },
        { text: asks },
      ],
    })),
  }));

const notesTable = ({ sheet }: HandoutInput): PaperTable => ({
  id: 'notes',
  title: 'Notes',
  columns: [{ title: 'Written on the plan', share: 1 }],
  rows: piecesOf(sheet.layout.pieces, 'note').flatMap(({ id, text }) =>
    text ? [{ key: id, cells: [{ text }] }] : [],
  ),
});

const CAUTIONS = [
  CAUTION_WORDS,
  'Vapours remain in and around the casualty, also after it is emptied.',
  FIELD_CAUTION_WORDS,
  'Never touch probes or leads while the test button is held.',
  'Connect the unit first, then its ground system: the last contact is made away from the vapour.',
];

const cautionsTable = (): PaperTable => ({
  id: 'cautions',
  title: 'Cautions',
  columns: [{ title: 'Read before anyone approaches', share: 1 }],
  rows: CAUTIONS.map((text) => ({ key: text, cells: [{ text, strong: true }] })),
});
