import type { ReactNode } from 'react';

export function BlankRow({ children }: { children: ReactNode }) {
  return <div className="flex flex-wrap border-b border-ink print:flex-nowrap">{children}</div>;
}

/** A labelled box to write in. */
export function Blank({ wide = false, children }: { wide?: boolean; children: ReactNode }) {
  return (
    <div
      className={`not-last:border-r min-h-11 min-w-[7rem] basis-0 border-ink px-1.5 py-0.5 print:min-h-[10mm] print:min-w-0 ${
        wide ? 'grow-[2]' : 'grow'
      }`}
    >
      {children}
    </div>
  );
}

/** A box to tick; drawn, because the shipped font has none. */
export function TickBox() {
  return <span className="mx-0.5 inline-block size-3 border border-ink align-[-0.1em]" />;
}
