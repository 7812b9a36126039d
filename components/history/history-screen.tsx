'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Problems } from '@/components/ui/problems';
import { When } from '@/components/ui/when';
import { Problem, restoreVersion, useChanges } from '@/lib/client/api';
import { VersionView, type Version } from './version-view';

/** Every save of a layout, newest first; any of them can be looked at, and made the newest again. */
export function HistoryScreen({
  layoutId,
  newest,
  version,
  mayDraw,
}: {
  layoutId: string;
  /** The version the layout had when this page was made. */
  newest: number;
  version: Version;
  mayDraw: boolean;
}) {
  const shown = version.number;
  const router = useRouter();
  const list = useChanges(layoutId);
  const changes = list.pages.flatMap((page) => page.changes);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<Problem | null>(null);
  const [restored, setRestored] = useState<{ from: number; as: number } | null>(null);
  const latest = Math.max(newest, changes[0]?.version ?? 0);

  async function restore() {
    setBusy(true);
    setProblem(null);
    try {
      const saved = await restoreVersion(layoutId, shown);
      setRestored({ from: shown, as: saved.version });
      await list.mutate();
      router.refresh();
    } catch (cause) {
      if (!(cause instanceof Problem)) throw cause;
      setProblem(cause);
    } finally {
      setBusy(false);
    }
  }

  return (
    <div className="mt-6 grid items-start gap-8 lg:grid-cols-[minmax(0,2fr)_minmax(0,3fr)]">
      <section aria-labelledby="versions" className="min-w-0">
        <h2 id="versions" className="border-b-2 border-ink text-lg font-bold">
          Versions
        </h2>
        {list.error && <Problems problem={list.error} className="mt-3" />}
        {list.isLoading && (
          <p role="status" className="py-2">
            Fetching the versions
          </p>
        )}
        <ol reversed>
          {changes.map((change) => {
            const here = change.version === shown;
            return (
              <li key={change.version} className="border-b border-rule-faint">
                <Link
                  href={`/layouts/${layoutId}/history?version=${change.version}`}
                  aria-current={here ? 'true' : undefined}
                  scroll={false}
                  className={`grid min-h-11 grid-cols-[3rem_minmax(0,1fr)] py-2 ${
                    here ? 'border-l-4 border-ink bg-margin pl-2' : 'hover:underline'
                  }`}
                >
                  <span className="text-lg font-bold leading-6">{change.version}</span>
                  <span>
                    <span className="font-semibold">{change.label}</span>
                    <span className="block">
                      <When at={change.at} />
                      {change.by && `, ${change.by.name}`}
                    </span>
                  </span>
                </Link>
              </li>
            );
          })}
        </ol>
        {list.hasMore && (
          <Button className="mt-3" onClick={() => void list.more()}>
            Show older versions
          </Button>
        )}
      </section>
      <section aria-labelledby="version" className="min-w-0">
        <h2 id="version" className="flex flex-wrap justify-between gap-x-4 text-lg font-bold">
          <span>Version {shown}</span>
          <span>{shown === latest ? 'the newest' : `read only; the newest is ${latest}`}</span>
        </h2>
        <VersionView version={version} />
        {restored && (
          <Notice
            className="mt-4"
            title={`Version ${restored.as} now holds what version ${restored.from} held.`}
          >
            Nothing was lost: every version before it is still in this list.{' '}
            <Link href={`/layouts/${layoutId}`} className="font-bold underline underline-offset-4">
              Open the drawing
            </Link>
          </Notice>
        )}
        {problem && <Problems problem={problem} className="mt-4" />}
        {mayDraw && shown !== latest && (
          <div className="mt-4">
            <Button look="action" disabled={busy} onClick={restore}>
              {busy ? 'Restoring' : `Make version ${shown} the newest`}
            </Button>
            <p className="mt-1 text-ink-soft">
              It is saved again as a new version. Version {latest} stays in the list.
            </p>
          </div>
        )}
      </section>
    </div>
  );
}
