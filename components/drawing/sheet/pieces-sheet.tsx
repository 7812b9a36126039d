'use client';

import { PiecesTable } from './after-plan';

/** The second sheet: every piece in a table, the plan's twin. */
export function PiecesSheet() {
  return (
    <div className="p-2">
      <section
        id="pieces"
        tabIndex={-1}
        aria-labelledby="pieces-title"
        className="border border-rule bg-paper px-4 py-4 outline-none sm:px-6"
      >
        <h2 id="pieces-title" className="mb-3 text-xl font-bold">
          Pieces
        </h2>
        <PiecesTable />
      </section>
    </div>
  );
}
