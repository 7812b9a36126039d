import type { Metadata } from 'next';
import { ReadingsPage } from '@/components/readings-page/readings-page';
import { PublicNav } from '@/components/shell/public-nav';
import { PrintButton } from '@/components/ui/print-button';
import { SheetFrame } from '@/components/ui/sheet-frame';

export const metadata: Metadata = {
  title: 'Blank readings page',
  description:
    'A page to print and fill in by hand: a grid for the sketch, and the readings of three ground systems.',
};

export default function BlankReadingsPage() {
  return (
    <SheetFrame printBare nav={<PublicNav />} title="Blank readings page">
      <div className="print:hidden">
        <h1 className="text-2xl font-bold">Blank readings page</h1>
        <p className="mt-2 max-w-[68ch]">
          One page, letter or A4, to fill in by hand: a grid for the sketch, then each of the three
          ground systems read alone, with Y moved either side. Print a few before you leave; it
          needs neither network nor sign-in once it is on paper.
        </p>
        <p className="mb-6 mt-4">
          <PrintButton>Print this page</PrintButton>
        </p>
      </div>
      <ReadingsPage />
    </SheetFrame>
  );
}
