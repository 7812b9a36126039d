import type { Metadata } from 'next';
import { PublicNav } from '@/components/shell/public-nav';
import { ButtonLink } from '@/components/ui/button';
import { SheetFrame } from '@/components/ui/sheet-frame';

export const metadata: Metadata = { title: 'Not found' };

export default function NotFound() {
  return (
    <SheetFrame nav={<PublicNav signIn={false} />} title="Not found">
      <h1 className="text-2xl font-bold">There is nothing at this address</h1>
      <p className="mt-3 max-w-[68ch]">
        It may be mistyped, or lead to something that is not your agency’s. Nothing was changed.
      </p>
      <p className="mt-4">
        <ButtonLink href="/sites" look="action">
          Go to the sites
        </ButtonLink>
      </p>
    </SheetFrame>
  );
}
