'use client';

import { useId, useState } from 'react';
import type { Finding, Missing } from '@/lib/checks';
import { STATUS_INK, STATUS_WORDS } from '@/components/ui/status';
import { StatusShape } from '@/components/ui/status-mark';
import { useDrawing } from '@/lib/client/use-drawing';
import { EnterHere } from './enter/enter-here';
import { FindingRow } from './finding-row';
import { foldWords } from './fold-words';
import type { Row } from './group-findings';
import { rangeWords } from './measure-words';

const NOTHING_OFFERED: ReadonlySet<Missing> = new Set();

/** A long run of alike findings as one line, which opens to each of them. */
export function FoldedRow({ row, offered }: { row: Row; offered: ReadonlySet<Missing> }) {
  const [open, setOpen] = useState(false);
  const listId = useId();
  const { findings, title } = row;
  const { status } = findings[0];
  const words = useDrawing((s) => foldWords(s.sheet, title, findings));
  return (
    <li data-status={status} className="py-px">
      <button
        type="button"
        aria-expanded={open}
        aria-controls={listId}
        onClick={() => setOpen(!open)}
        className="pointer-coarse:min-h-11 grid min-h-6 w-full cursor-pointer grid-cols-[1.125rem_minmax(0,1fr)_auto] items-start gap-x-1.5 text-left leading-snug"
      >
        <span className="pt-px">
          <StatusShape status={status} />
        </span>
        <span>
          <span className="sr-only">{STATUS_WORDS[status]}: </span>
          <WithChevron words={words} open={open} />
        </span>
        <strong className={`whitespace-nowrap pl-2 text-lg leading-tight ${STATUS_INK[status]}`}>
          {rangeWords(findings) ?? (status === 'not-known' && 'not known')}
        </strong>
      </button>
      {status === 'not-known' && (
        <div className="ml-6 pb-1">
          <EnterHere finding={findings[0]} offered={offered} />
        </div>
      )}
      <ul id={listId} hidden={!open} className="ml-6 border-l-2 border-rule pl-2">
        {open &&
          findings.map((finding: Finding) => (
            <FindingRow
              key={finding.id}
              finding={finding}
              title={title}
              offered={NOTHING_OFFERED}
            />
          ))}
      </ul>
    </li>
  );
}

/** The sign keeps to the last word, so that it never stands on a line of its own. */
function WithChevron({ words, open }: { words: string; open: boolean }) {
  const cut = words.lastIndexOf(' ') + 1;
  return (
    <>
      {words.slice(0, cut)}
      <span className="whitespace-nowrap">
        {words.slice(cut)} <Chevron open={open} />
      </span>
    </>
  );
}

/** Which way it opens; drawn, because the shipped font has no such sign. */
function Chevron({ open }: { open: boolean }) {
  return (
    <svg
      viewBox="0 0 10 10"
      width="0.7em"
      height="0.7em"
      aria-hidden="true"
      className={`inline-block stroke-ink-soft ${open ? 'rotate-90' : ''}`}
    >
      <path d="M3 1 L7.5 5 L3 9" fill="none" strokeWidth="1.8" />
    </svg>
  );
}
