'use client';

import dynamic from 'next/dynamic';

// Below the plan and not needed to draw: its code may come after the plan answers.
const PiecesTable = dynamic(() => import('@/components/pieces').then((m) => m.PiecesTable), {
  ssr: false,
  loading: () => <p>Listing the pieces …</p>,
});

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
