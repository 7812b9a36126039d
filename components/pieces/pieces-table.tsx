'use client';

import { useTable } from '@tanstack/react-table';
import { Fragment, useMemo, useState } from 'react';
import type { DrawingState } from '@/lib/client/drawing-store';
import { useDrawing } from '@/lib/client/use-drawing';
import { AddPiece } from './add-piece';
import { ChangePlace } from './change-place';
import { columns, features } from './piece-columns';
import { referenceOf } from './piece-place';
import { pieceRows } from './piece-rows';
import { TellLayout } from './tell-layout';
import { useAtRest } from './use-at-rest';

const pickSheet = (state: DrawingState) => state.sheet;
const pickFindings = (state: DrawingState) => state.findings;

/** Every piece in a table: the plan's twin for the keyboard and for who does not see it. */
export function PiecesTable() {
  const sheet = useAtRest(pickSheet);
  const findings = useAtRest(pickFindings);
  const canDraw = useDrawing((s) => s.canDraw);
  const data = useMemo(() => pieceRows(sheet, findings), [sheet, findings]);
  const [changing, setChanging] = useState<string | null>(null);
  const from = referenceOf(sheet.layout).words;
  const table = useTable({
    features,
    columns,
    data,
    getRowId: (row) => row.id,
    sortDescFirst: false,
  });

  return (
    <section aria-label="Pieces" className="space-y-4">
      {canDraw && <AddPiece />}
      <p className="text-ink-soft">
        {data.length} {data.length === 1 ? 'piece' : 'pieces'}. Bearing from true north and distance
        are taken from the {from} to the middle of the piece.
      </p>
      <div
        className="relative overflow-x-auto"
        tabIndex={0}
        role="region"
        aria-label="Table of pieces"
      >
        <table className="w-full border-collapse text-left leading-snug">
          <thead>
            {table.getHeaderGroups().map((group) => (
              <tr key={group.id} className="border-b-2 border-ink align-bottom">
                {group.headers.map((header) => (
                  <SortableHeader
                    key={header.id}
                    sorted={header.column.getIsSorted()}
                    onSort={() => header.column.toggleSorting()}
                  >
                    <table.FlexRender header={header} />
                  </SortableHeader>
                ))}
                {canDraw && (
                  <th scope="col">
                    <span className="sr-only">Change</span>
                  </th>
                )}
              </tr>
            ))}
          </thead>
          <tbody>
            {table.getRowModel().rows.map((row) => (
              <Fragment key={row.id}>
                <PieceLine id={row.id}>
                  {row.getAllCells().map((cell, place) =>
                    place === 0 ? (
                      <th key={cell.id} scope="row" className="py-1 pr-3 font-normal">
                        <SelectPiece id={row.id} name={row.original.name} />
                      </th>
                    ) : (
                      <td key={cell.id} className="py-1 pr-3">
                        <table.FlexRender cell={cell} />
                      </td>
                    ),
                  )}
                  {canDraw && (
                    <td className="py-1 text-right">
                      <button
                        type="button"
                        aria-expanded={changing === row.id}
                        className="pointer-coarse:min-h-11 min-h-8 cursor-pointer underline underline-offset-4"
                        onClick={() => setChanging(changing === row.id ? null : row.id)}
                      >
                        {changing === row.id ? 'Close' : 'Change'}
                        <span className="sr-only"> {row.original.name}</span>
                      </button>
                    </td>
                  )}
                </PieceLine>
                {canDraw && changing === row.id && (
                  <tr className="border-b border-rule">
                    <td colSpan={row.getAllCells().length + 1}>
                      <ChangePlace id={row.id} onDone={() => setChanging(null)} />
                    </td>
                  </tr>
                )}
              </Fragment>
            ))}
          </tbody>
        </table>
        {data.length === 0 && (
          <p className="py-4">
            Nothing is drawn yet. Place the casualty vehicle first: everything is measured from it.
          </p>
        )}
      </div>
      <TellLayout />
    </section>
  );
}

const ARIA_SORT = { asc: 'ascending', desc: 'descending' } as const;

function SortableHeader({
  sorted,
  onSort,
  children,
}: {
  sorted: false | 'asc' | 'desc';
  onSort: () => void;
  children: React.ReactNode;
}) {
  return (
    <th scope="col" aria-sort={sorted ? ARIA_SORT[sorted] : 'none'} className="pr-3">
      <button
        type="button"
        onClick={onSort}
        className="pointer-coarse:min-h-11 inline-flex min-h-8 cursor-pointer items-center gap-1 text-left font-bold"
      >
        {children}
        <svg viewBox="0 0 10 10" width="10" height="10" aria-hidden="true" className="fill-ink">
          {sorted !== 'desc' && <path d="M5 0L9 4H1Z" className={sorted ? '' : 'opacity-40'} />}
          {sorted !== 'asc' && <path d="M5 10L1 6H9Z" className={sorted ? '' : 'opacity-40'} />}
        </svg>
      </button>
    </th>
  );
}

function PieceLine({ id, children }: { id: string; children: React.ReactNode }) {
  const selected = useDrawing((s) => s.selection === id);
  const hover = useDrawing((s) => s.hover);
  return (
    <tr
      onPointerEnter={() => hover(id)}
      onPointerLeave={() => hover(null)}
      className={`border-b border-rule-faint align-baseline ${selected ? 'bg-spruce-wash' : ''}`}
    >
      {children}
    </tr>
  );
}

function SelectPiece({ id, name }: { id: string; name: string }) {
  const selected = useDrawing((s) => s.selection === id);
  const select = useDrawing((s) => s.select);
  return (
    <button
      type="button"
      aria-pressed={selected}
      className="pointer-coarse:min-h-11 inline-block min-h-8 cursor-pointer text-left font-semibold underline decoration-rule underline-offset-4 first-letter:uppercase"
      onClick={() => select(selected ? null : id)}
    >
      {name}
    </button>
  );
}
