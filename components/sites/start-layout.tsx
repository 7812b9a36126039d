'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input, Select } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { Problems } from '@/components/ui/problems';
import type { CreatedLayout, NewLayout, SiteAnswer } from '@/lib/api';
import { MOST_BYTES } from '@/lib/api/common';
import { createLayout, Problem, useLayouts } from '@/lib/client/api';
import { parsePosition, quantise } from '@/lib/geo';
import { readExchangeFile } from './exchange-file';

const SOURCES = ['nothing', 'layout', 'file'] as const;
type Source = (typeof SOURCES)[number];

const SOURCE_WORDS: Record<Source, string> = {
  nothing: 'from nothing',
  layout: 'from a layout of this site',
  file: 'from an exchange file',
};

/** Where a layout begins: an empty plan, a copy, or a file that is checked before anything is kept. */
export function StartLayout({ site }: { site: SiteAnswer }) {
  const router = useRouter();
  const list = useLayouts(site.id);
  const layouts = list.pages.flatMap((page) => page.layouts);
  const [source, setSource] = useState<Source>('nothing');
  const [name, setName] = useState('');
  const [copied, setCopied] = useState('');
  const [file, setFile] = useState<File | null>(null);
  const [takeGround, setTakeGround] = useState(false);
  const [position, setPosition] = useState('');
  const [busy, setBusy] = useState(false);
  const [complaint, setComplaint] = useState<string | null>(null);
  const [problem, setProblem] = useState<Problem | null>(null);
  const [made, setMade] = useState<CreatedLayout | null>(null);

  const needsPosition = source === 'nothing' && site.at === null;
  const copiedId = copied || layouts[0]?.id;

  async function body(): Promise<NewLayout | string> {
    const base = { name: name.trim() || null };
    if (source === 'layout') {
      return copiedId ? { ...base, from: { layoutId: copiedId } } : 'Pick the layout to copy.';
    }
    if (source === 'file') {
      if (!file) return 'Pick the file first.';
      const read = await readExchangeFile(file, MOST_BYTES.ground);
      return read.ok ? { ...base, from: { file: read.file, takeGround } } : read.why;
    }
    if (!needsPosition) return base;
    const read = parsePosition(position);
    return read.ok
      ? { ...base, origin: [...quantise(read.place)] }
      : `This site has no position yet. ${read.message}`;
  }

  async function start(event: React.FormEvent) {
    event.preventDefault();
    setProblem(null);
    setComplaint(null);
    setBusy(true);
    try {
      const request = await body();
      if (typeof request === 'string') return setComplaint(request);
      const layout = await createLayout(site.id, request);
      if (layout.not_taken.length === 0) return router.push(`/layouts/${layout.id}`);
      setMade(layout);
      await list.mutate();
    } catch (cause) {
      if (!(cause instanceof Problem)) throw cause;
      setProblem(cause);
    } finally {
      setBusy(false);
    }
  }

  return (
    <section aria-labelledby="start" className="min-w-0">
      <h2 id="start" className="border-b-2 border-ink text-lg font-bold">
        Start a layout
      </h2>
      <form onSubmit={start} noValidate className="mt-3 flex flex-col gap-4">
        <fieldset className="flex flex-wrap gap-x-6">
          <legend className="sr-only">Start</legend>
          {SOURCES.map((candidate) => (
            <label key={candidate} className="inline-flex min-h-11 items-center gap-2">
              <input
                type="radio"
                name="source"
                className="size-5"
                checked={source === candidate}
                disabled={candidate === 'layout' && layouts.length === 0}
                onChange={() => setSource(candidate)}
              />
              {SOURCE_WORDS[candidate]}
            </label>
          ))}
        </fieldset>
        {source === 'layout' && (
          <Field label="Layout to copy">
            {(ties) => (
              <Select
                {...ties}
                value={copiedId}
                onChange={(event) => setCopied(event.target.value)}
              >
                {layouts.map((layout) => (
                  <option key={layout.id} value={layout.id}>
                    {layout.name}
                  </option>
                ))}
              </Select>
            )}
          </Field>
        )}
        {source === 'file' && (
          <>
            <Field
              label="Exchange file"
              hint="GeoJSON as Stillground writes it. The whole file is checked before anything is kept."
            >
              {(ties) => (
                <Input
                  {...ties}
                  type="file"
                  accept=".geojson,.json,application/geo+json,application/json"
                  onChange={(event) => setFile(event.target.files?.[0] ?? null)}
                />
              )}
            </Field>
            <label className="inline-flex min-h-11 items-center gap-2">
              <input
                type="checkbox"
                className="size-5"
                checked={takeGround}
                onChange={(event) => setTakeGround(event.target.checked)}
              />
              Also take the file’s buried lines, answers and tickets into this site
            </label>
          </>
        )}
        {needsPosition && (
          <Field
            label="Where the plan begins"
            hint="Latitude and longitude, or a US National Grid reference; this site has no position yet"
          >
            {(ties) => (
              <Input
                {...ties}
                value={position}
                onChange={(event) => setPosition(event.target.value)}
              />
            )}
          </Field>
        )}
        <Field label="Name" hint="Such as “plan B”; it can be changed later">
          {(ties) => (
            <Input
              {...ties}
              value={name}
              maxLength={200}
              autoComplete="off"
              onChange={(event) => setName(event.target.value)}
            />
          )}
        </Field>
        {complaint && <Notice kind="failed" title={complaint} />}
        {problem && (
          <Problems
            problem={problem}
            pathsWithin="from.file"
            title={problem.faults.length > 0 ? faultsTitle(problem.faults.length) : undefined}
          />
        )}
        {made && (
          <Notice kind="caution" title="The layout is made. Left out of it:">
            <ul className="list-disc pl-5">
              {made.not_taken.map((words) => (
                <li key={words}>{words}</li>
              ))}
            </ul>
            <Link
              href={`/layouts/${made.id}`}
              className="inline-flex min-h-11 items-center font-bold underline underline-offset-4"
            >
              Open the drawing
            </Link>
          </Notice>
        )}
        <div>
          <Button type="submit" look="action" disabled={busy}>
            {busy ? 'Starting the layout' : 'Start the layout'}
          </Button>
        </div>
      </form>
    </section>
  );
}

const faultsTitle = (count: number): string =>
  count === 1
    ? 'The file has a fault. Nothing was changed.'
    : `The file has ${count} faults. Nothing was changed.`;
