import { PX_PER_MM } from '@/lib/draw';
import type { Status } from '@/lib/checks';
import { linesNeeded } from './lines-needed';
import { paginate, type Block } from './paginate';

/** A table as data: what it says, and enough to know how high each row will stand. */
export type PaperTable = {
  readonly id: string;
  readonly title: string;
  /** Said once under the title. */
  readonly lead?: string;
  readonly columns: readonly Column[];
  readonly rows: readonly Row[];
  /** Rows that are written in by hand need room. */
  readonly rowMm?: number;
};

export type Column = { readonly title: string; readonly share: number; readonly right?: boolean };
export type Row = { readonly key: string; readonly cells: readonly Cell[] };
export type Cell = {
  readonly text: string;
  readonly strong?: boolean;
  readonly status?: Status;
  /** The text is a form with `_` lines and `[]` boxes. */
  readonly form?: boolean;
};

/** Print sizes that the style sheet sets too; both sides are held together by a test. */
export const TEXT_PX = 13;
export const LINE_MM = 4.4;
export const CELL_PAD_MM = { x: 1.6, y: 0.75 } as const;
export const TITLE_MM = 10;
/** Columns whose heads need more lines than one stand higher by a line each. */
export const HEAD_MM = 6.2;

/** A part of a table that fell on one page. */
export type TablePart = {
  readonly table: PaperTable;
  readonly rows: readonly Row[];
  readonly continued: boolean;
};

type Item = { readonly table: PaperTable; readonly row: Row | null; readonly withNext: boolean };

/** Tables one under another on pages of that size, broken only between rows. */
export function tablePages(
  tables: readonly PaperTable[],
  size: { readonly widthMm: number; readonly heightMm: number },
): TablePart[][] {
  const blocks = tables.flatMap((table): Block<Item>[] => [
    { heightMm: headingMm(table, size.widthMm), item: { table, row: null, withNext: true } },
    ...table.rows.map((row) => ({
      heightMm: rowMm(table, row, size.widthMm),
      leadMm: TITLE_MM + headMm(table, size.widthMm),
      item: { table, row, withNext: false },
    })),
  ]);
  return paginate(blocks, size.heightMm).map(partsOf);
}

function partsOf(page: readonly Item[]): TablePart[] {
  const parts: { table: PaperTable; rows: Row[]; continued: boolean }[] = [];
  for (const { table, row } of page) {
    let part = parts.at(-1);
    if (part?.table !== table) {
      part = { table, rows: [], continued: row !== null };
      parts.push(part);
    }
    if (row) part.rows.push(row);
  }
  return parts;
}

function headingMm(table: PaperTable, widthMm: number): number {
  const lead = table.lead ? linesNeeded(table.lead, widthMm * PX_PER_MM, TEXT_PX) : 0;
  return TITLE_MM + headMm(table, widthMm) + lead * LINE_MM;
}

function headMm({ columns }: PaperTable, widthMm: number): number {
  const lines = columns.map(({ title }, i) =>
    linesNeeded(title, columnPx(columns, i, widthMm), TEXT_PX, 600),
  );
  return HEAD_MM + (Math.max(...lines) - 1) * LINE_MM;
}

function columnPx(columns: readonly Column[], index: number, widthMm: number): number {
  const whole = columns.reduce((sum, { share }) => sum + share, 0);
  const width = ((columns[index]?.share ?? 1) / whole) * widthMm - CELL_PAD_MM.x * 2;
  return width * PX_PER_MM;
}

function rowMm({ columns, rowMm: least = 0 }: PaperTable, row: Row, widthMm: number): number {
  const lines = row.cells.map((cell, i) =>
    linesNeeded(measured(cell), columnPx(columns, i, widthMm), TEXT_PX, cell.strong ? 700 : 400),
  );
  return Math.max(least, Math.max(...lines) * LINE_MM + CELL_PAD_MM.y * 2 + 0.3);
}

/** Lines to write on and status shapes take room that the bare text does not show. */
const measured = ({ text, form, status }: Cell): string => {
  const shown = form ? text.replaceAll('_', 'nnnnnnnnnnnn').replaceAll('[]', 'nn') : text;
  return status ? `nn ${shown}` : shown;
};
