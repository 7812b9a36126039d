'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Problems } from '@/components/ui/problems';
import { When } from '@/components/ui/when';
import type { StaleGround } from '@/lib/api';
import { Problem, saveGround, useGround } from '@/lib/client/api';
import { AnswersList } from './answers-list';
import {
  draftComplaint,
  draftLabel,
  EMPTY_DRAFT,
  isTouched,
  rebasedLocates,
  withDraft,
} from './ground-draft';
import { GroundFeatures } from './ground-features';
import { LocatesList } from './locates-list';
import { OverheadLine } from './overhead-line';

/** What lies under and over the site, with the owners' answers and tickets editable in place. */
export function GroundSection({ siteId, mayChange }: { siteId: string; mayChange: boolean }) {
  const { data, error, mutate } = useGround(siteId);
  const [draft, setDraft] = useState(EMPTY_DRAFT);
  const [editing, setEditing] = useState(false);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<Problem | null>(null);
  const [complaint, setComplaint] = useState<string | null>(null);
  const [newer, setNewer] = useState<StaleGround | null>(null);

  if (error && !data) return <Problems problem={error} />;
  if (!data) return <p role="status">Fetching what is known of the ground</p>;

  const ground = withDraft(data.ground, draft);
  const put = (part: Partial<typeof draft>) => setDraft((before) => ({ ...before, ...part }));
  const close = () => {
    setDraft(EMPTY_DRAFT);
    setEditing(false);
    setProblem(null);
    setComplaint(null);
    setNewer(null);
  };

  async function save() {
    const lacks = draftComplaint(draft);
    setComplaint(lacks);
    if (lacks || !data) return;
    setBusy(true);
    setProblem(null);
    try {
      await saveGround(siteId, data.version, { ground, label: draftLabel(draft) });
      await mutate();
      close();
    } catch (cause) {
      if (!(cause instanceof Problem)) throw cause;
      if (cause.code === 'stale') {
        // Theirs becomes what the entries lie on; the person decides whether to save again.
        const theirs = cause.current as StaleGround;
        if (draft.locates) {
          put({
            locates: rebasedLocates(data.ground.locates, draft.locates, theirs.ground.locates),
          });
        }
        setNewer(theirs);
        await mutate();
      } else {
        setProblem(cause);
      }
    } finally {
      setBusy(false);
    }
  }

  const editor = editing ? put : null;
  return (
    <section aria-labelledby="ground" className="min-w-0">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4 border-b-2 border-ink">
        <h2 id="ground" className="text-lg font-bold">
          What is under and over this ground
        </h2>
        <span className="text-ink-soft">
          entered <When at={data.saved_at} />
          {data.saved_by && `, ${data.saved_by.name}`}
        </span>
      </div>
      <AnswersList ground={ground} edit={editor} answers={draft.answers} />
      <OverheadLine ground={ground} edit={editor} />
      <LocatesList ground={ground} edit={editor} />
      {newer && (
        <Notice
          kind="caution"
          className="mt-4"
          title={`${newer.saved_by?.name ?? 'Someone else'} saved this ground before you.`}
        >
          Theirs is kept and shown; your entries lie on top of it and are not saved yet. Save them
          too, or put them away.
        </Notice>
      )}
      {problem && <Problems problem={problem} className="mt-4" />}
      {complaint && <Notice kind="failed" title={complaint} className="mt-4" />}
      {mayChange && (
        <div className="mt-4 flex flex-wrap gap-3">
          {editing ? (
            <>
              <Button look="action" disabled={busy || !isTouched(draft)} onClick={save}>
                {busy ? 'Saving' : newer ? 'Save mine too' : 'Save answers and tickets'}
              </Button>
              <Button disabled={busy} onClick={close}>
                {isTouched(draft) ? 'Put my entries away' : 'Close'}
              </Button>
            </>
          ) : (
            <Button onClick={() => setEditing(true)}>Change answers and tickets</Button>
          )}
        </div>
      )}
      <GroundFeatures ground={ground} />
    </section>
  );
}
