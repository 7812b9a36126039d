'use client';

import { useDeferredValue, useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { Problems } from '@/components/ui/problems';
import { useSites } from '@/lib/client/api';
import { NewSite } from './new-site';
import { NoSites } from './no-sites';
import { SitesMap } from './sites-map-lazy';
import { SitesTable } from './sites-table';

/** All sites of the agency: a table to search, a map of what the table shows. */
export function SitesScreen({ mayChange }: { mayChange: boolean }) {
  const [words, setWords] = useState('');
  const asked = useDeferredValue(words.trim());
  const list = useSites(asked || undefined);
  const sites = useMemo(() => list.pages.flatMap((page) => page.sites), [list.pages]);
  const nothingYet = !list.isLoading && !list.error && sites.length === 0;

  if (nothingYet && asked === '') return <NoSites mayChange={mayChange} />;
  return (
    <>
      <div className="flex flex-wrap items-end justify-between gap-4">
        <h1 className="text-2xl font-bold">Sites</h1>
        {mayChange && <NewSite />}
      </div>
      <div className="mt-4 grid items-start gap-8 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <section aria-label="List of sites" className="min-w-0">
          <Field label="Search by name or place" className="max-w-md">
            {(ties) => (
              <Input
                {...ties}
                type="search"
                value={words}
                onChange={(event) => setWords(event.target.value)}
                maxLength={200}
              />
            )}
          </Field>
          {list.error && <Problems problem={list.error} className="mt-4" />}
          {!list.error && (
            <p role="status" className="mt-4 text-ink-soft">
              {list.isLoading
                ? 'Fetching the sites'
                : countWords(sites.length, list.hasMore, asked)}
            </p>
          )}
          {sites.length > 0 && <SitesTable sites={sites} />}
          {list.hasMore && (
            <Button className="mt-4" onClick={() => void list.more()}>
              Show more sites
            </Button>
          )}
        </section>
        <section aria-label="Map of the sites listed" className="min-w-0">
          <SitesMap sites={sites} />
        </section>
      </div>
    </>
  );
}

function countWords(count: number, more: boolean, asked: string): string {
  const number = `${count}${more ? ' and more' : ''}`;
  if (asked === '') return count === 1 ? '1 site' : `${number} sites`;
  if (count === 0) {
    return `No site has “${asked}” in its name or place. Look for fewer letters, or clear the search.`;
  }
  return `${number} with “${asked}” in name or place`;
}
