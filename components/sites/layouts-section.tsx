'use client';

import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { Problems } from '@/components/ui/problems';
import { When } from '@/components/ui/when';
import type { LayoutRow } from '@/lib/api';
import { PATHS, useLayouts } from '@/lib/client/api';

/** The site's layouts, the one saved last first. */
export function LayoutsSection({ siteId }: { siteId: string }) {
  const list = useLayouts(siteId);
  const layouts = list.pages.flatMap((page) => page.layouts);
  return (
    <section aria-labelledby="layouts" className="min-w-0">
      <h2 id="layouts" className="border-b-2 border-ink text-lg font-bold">
        Layouts
      </h2>
      {list.error && <Problems problem={list.error} className="mt-3" />}
      {list.isLoading && (
        <p role="status" className="py-2">
          Fetching the layouts
        </p>
      )}
      {!list.isLoading && !list.error && layouts.length === 0 && (
        <p className="py-2">
          Nothing has been drawn here yet. A layout shows where the three vehicles, the three ground
          systems and the probes go, and whether they may. Start one below.
        </p>
      )}
      <ul>
        {layouts.map((layout) => (
          <LayoutLine key={layout.id} layout={layout} />
        ))}
      </ul>
      {list.hasMore && (
        <Button className="mt-3" onClick={() => void list.more()}>
          Show more layouts
        </Button>
      )}
    </section>
  );
}

function LayoutLine({ layout }: { layout: LayoutRow }) {
  return (
    <li className="border-b border-rule-faint py-2">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <Link
          href={`/layouts/${layout.id}`}
          className="inline-flex min-h-11 items-center text-lg font-bold underline decoration-1 underline-offset-4 hover:decoration-2"
        >
          {layout.name}
        </Link>
        {/* Nothing here can have been approved: a layout is a draft until it is reviewed. */}
        <span className="font-bold text-alarm">DRAFT, NOT APPROVED</span>
      </div>
      <p>
        {layout.pieces === 1 ? '1 piece' : `${layout.pieces} pieces`}
        {layout.drawn_by && `, drawn by ${layout.drawn_by.name}`}; version {layout.version}, saved{' '}
        <When at={layout.saved_at} />
        {layout.saved_by && ` by ${layout.saved_by.name}`}
      </p>
      <p className="flex flex-wrap gap-x-5">
        <Link href={`/layouts/${layout.id}/history`} className={LINK}>
          History<span className="sr-only"> of {layout.name}</span>
        </Link>
        <a href={PATHS.exportFile(layout.id)} download className={LINK}>
          Exchange file<span className="sr-only"> of {layout.name}</span>
        </a>
      </p>
    </li>
  );
}

const LINK = 'inline-flex min-h-11 items-center underline decoration-1 underline-offset-4';
