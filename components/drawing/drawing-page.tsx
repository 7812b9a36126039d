'use client';

import Link from 'next/link';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Problems } from '@/components/ui/problems';
import type { LayoutAnswer } from '@/lib/api';
import { useLayout, type Problem } from '@/lib/client/api';
import { DrawingScreen } from './drawing-screen';

/** Opens one layout. Once open, the drawing keeps its own copy and is not pulled from the hand. */
export function DrawingPage({ layoutId }: { layoutId: string }) {
  const { data, error, isValidating, mutate } = useLayout(layoutId);
  const [opened, setOpened] = useState<LayoutAnswer | null>(null);
  if (!opened && data && !isValidating) setOpened(data);

  if (opened) return <DrawingScreen key={opened.id} answer={opened} />;
  if (error) return <NotOpened problem={error} onAgain={() => void mutate()} />;
  return (
    <main className="grid min-h-dvh place-items-center p-6">
      <p role="status">Opening the layout …</p>
    </main>
  );
}

function NotOpened({ problem, onAgain }: { problem: Problem; onAgain: () => void }) {
  const gone = problem.code === 'not-found' || problem.code === 'bad-request';
  return (
    <main className="mx-auto max-w-2xl p-6">
      <h1 className="text-2xl font-bold">
        {gone ? 'There is no such layout' : 'The layout did not open'}
      </h1>
      {gone ? (
        <p className="mt-3">
          Your agency has no layout at this address. It may have been mistyped, or belong to another
          agency.
        </p>
      ) : (
        <Problems problem={problem} className="mt-4" />
      )}
      <div className="mt-5 flex flex-wrap items-center gap-4">
        {!gone && (
          <Button look="action" onClick={onAgain}>
            Try again
          </Button>
        )}
        <Link href="/sites" className="inline-flex min-h-11 items-center underline">
          All sites
        </Link>
      </div>
    </main>
  );
}
