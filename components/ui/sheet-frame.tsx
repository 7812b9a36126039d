import type { ReactNode } from 'react';

export type TitleCell = { label: string; value: ReactNode };

/**
 * An ordinary page as a drawing sheet: a thin outer rule, a heavy inner frame with the paper, the
 * ways about seated in the top margin, the title block in the bottom right corner as on any
 * engineering sheet. The caution stands in the bottom margin of every page that needs it.
 */
export function SheetFrame({
  nav,
  title,
  status,
  cells = [],
  caution,
  printBare = false,
  children,
}: {
  nav: ReactNode;
  title: string;
  /** A word set large beside the title: DRAFT, NOT APPROVED, a version. */
  status?: ReactNode;
  cells?: readonly TitleCell[];
  caution?: ReactNode;
  /** Only the sheet's contents go on paper, without frame and title block. */
  printBare?: boolean;
  children: ReactNode;
}) {
  const onPaper = printBare
    ? {
        outer: 'print:p-0',
        rule: 'print:border-0',
        frame: 'print:m-0 print:border-0',
        foot: 'print:hidden',
      }
    : { outer: '', rule: '', frame: '', foot: '' };
  return (
    <div className={`min-h-dvh p-1.5 sm:p-2 print:min-h-0 ${onPaper.outer}`}>
      <div
        className={`flex min-h-[calc(100dvh-0.75rem)] flex-col border border-rule sm:min-h-[calc(100dvh-1rem)] print:min-h-0 ${onPaper.rule}`}
      >
        <a
          href="#sheet"
          className="sr-only bg-ink text-paper focus:not-sr-only focus:absolute focus:z-50 focus:px-4 focus:py-3"
        >
          Skip to the sheet
        </a>
        <header className="px-3 sm:px-6 print:hidden">{nav}</header>
        <div
          className={`mx-2 flex grow flex-col border-2 border-ink bg-paper sm:mx-6 ${onPaper.frame}`}
        >
          <main
            id="sheet"
            tabIndex={-1}
            className={`grow outline-none ${printBare ? 'print:p-0' : ''} px-4 py-6 sm:px-8 sm:py-8`}
          >
            {children}
          </main>
          <footer
            className={`flex flex-col sm:flex-row sm:items-end sm:justify-between ${onPaper.foot}`}
          >
            <div className="px-4 pb-4 sm:max-w-[60ch] sm:px-8 sm:pb-6">{caution}</div>
            <TitleBlock title={title} status={status} cells={cells} />
          </footer>
        </div>
        <div className="h-2 sm:h-6 print:hidden" />
      </div>
    </div>
  );
}

function TitleBlock({
  title,
  status,
  cells,
}: {
  title: string;
  status: ReactNode;
  cells: readonly TitleCell[];
}) {
  return (
    <div className="shrink-0 border-t-2 border-ink sm:w-[24rem] sm:border-l-2">
      <p className="flex items-baseline justify-between gap-4 px-4 py-2 text-lg font-bold">
        <span>{title}</span>
        {status && <span className="text-base">{status}</span>}
      </p>
      {cells.length > 0 && (
        <dl className="flex flex-wrap border-t border-ink">
          {cells.map((cell) => (
            <div
              key={cell.label}
              className="not-last:border-r min-w-[8rem] grow basis-0 border-ink px-4 py-1.5"
            >
              <dt className="text-sm text-ink-soft">{cell.label}</dt>
              <dd>{cell.value}</dd>
            </div>
          ))}
        </dl>
      )}
    </div>
  );
}
