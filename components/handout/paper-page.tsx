import type { ReactNode } from 'react';
import { CAUTION_WORDS } from '@/components/ui/caution';
import type { SizeMm } from '@/lib/draw';

/** One sheet of paper of exactly that size, with the caution and the page's number at its foot. */
export function PaperPage({
  size,
  number,
  of,
  foot,
  children,
}: {
  size: SizeMm;
  number: number;
  of: number;
  /** Whose it is and what its figures are in. */
  foot: string;
  children: ReactNode;
}) {
  return (
    <section
      aria-label={`Page ${number} of ${of}`}
      className="paper-page"
      style={{ width: `${size.widthMm}mm`, height: `${size.heightMm}mm` }}
    >
      {children}
      <footer className="paper-foot">
        <strong>{CAUTION_WORDS}</strong>
        <span>
          {foot} · page {number} of {of}
        </span>
      </footer>
    </section>
  );
}
