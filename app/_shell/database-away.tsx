import { PublicNav } from '@/components/shell/public-nav';
import { Reload } from '@/components/shell/reload';
import { SheetFrame } from '@/components/ui/sheet-frame';

export function DatabaseAway() {
  return (
    <SheetFrame nav={<PublicNav signIn={false} />} title="No database">
      <h1 className="text-2xl font-bold">The database is not answering</h1>
      <p className="mt-3 max-w-[68ch]">
        This page can’t be shown just now. What has been saved is kept, and a drawing that is open
        keeps its changes in its browser and saves them when the database returns.
      </p>
      <p className="mt-4">
        <Reload />
      </p>
    </SheetFrame>
  );
}
