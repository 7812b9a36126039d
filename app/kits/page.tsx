import type { Metadata } from 'next';
import { signedInPage } from '@/app/_shell/signed-in-page';
import { SignedInSheet } from '@/app/_shell/signed-in-sheet';
import { KitTable } from '@/components/kits/kit-table';
import { listKits } from '@/lib/server/kits/list-kits';

export const metadata: Metadata = { title: 'Kits' };

export default function KitsPage() {
  return signedInPage('/kits', async (person) => {
    const { kits } = await listKits(person);
    return (
      <SignedInSheet person={person} title="Kits">
        <h1 className="text-2xl font-bold">Kits</h1>
        <p className="mt-2 max-w-[68ch]">
          What is on the truck, as it is counted. A layout takes a copy when its kit is picked, so a
          kit that changes later does not change what was already drawn.
        </p>
        {kits.length === 0 && (
          <p className="mt-6 max-w-[68ch]">
            No kit is entered yet. Until one is, whether the cables reach is not known on any
            layout.
          </p>
        )}
        <div className="mt-6 grid items-start gap-8 lg:grid-cols-2">
          {kits.map((kit) => (
            <KitTable key={kit.id} kit={kit} />
          ))}
        </div>
      </SignedInSheet>
    );
  });
}
