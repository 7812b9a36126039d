'use client';

import { PublicNav } from '@/components/shell/public-nav';
import { Button } from '@/components/ui/button';
import { SheetFrame } from '@/components/ui/sheet-frame';

/** What failed stays in the server's log under the digest; people get what is kept and what next. */
export default function Failed({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  return (
    <SheetFrame nav={<PublicNav signIn={false} />} title="Failed">
      <h1 className="text-2xl font-bold">This page could not be shown</h1>
      <p className="mt-3 max-w-[68ch]">
        Something failed in it. What has been saved is kept, and a drawing keeps its unsaved changes
        in this browser. Try again; if it keeps failing, tell your administrator
        {error.digest ? ` and give the reference ${error.digest}.` : ' when it happened.'}
      </p>
      <p className="mt-4">
        <Button look="action" onClick={reset}>
          Try again
        </Button>
      </p>
    </SheetFrame>
  );
}
