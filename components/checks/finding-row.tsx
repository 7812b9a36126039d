'use client';

import { memo, useId, useState } from 'react';
import type { Finding, Missing } from '@/lib/checks';
import { Button } from '@/components/ui/button';
import { STATUS_INK, STATUS_WORDS } from '@/components/ui/status';
import { StatusShape } from '@/components/ui/status-mark';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { needsAttention } from './count-findings';
import { EnterHere } from './enter/enter-here';
import { Gauge } from './gauge';
import { lineWords, pieceOf } from './line-words';
import { allowedWords } from './measure-words';
import { lineValue } from './value-words';
import { Why } from './why';

/**
 * One finding: status, words, value, gauge; its remedy, or the field for what is not known, under
 * it. The plan shows it while it is pointed at, and pressing it selects what it is about.
 */
export const FindingRow = memo(function FindingRow({ finding, title, offered }: RowProps) {
  const store = useDrawingStore();
  const words = useDrawing((s) => lineWords(s.sheet, finding));
  const shown = useDrawing((s) => s.shownFinding === finding.id);
  const [why, setWhy] = useState(false);
  const whyId = useId();
  const attention = needsAttention(finding.status);
  const canDraw = useDrawing((s) => s.canDraw);
  /** Something can be done in the line: its remedy, or a field for what is missing. */
  const acts = canDraw && attention && (finding.remedy !== null || finding.missing.length > 0);
  const ink = STATUS_INK[finding.status];
  const counted = finding.measured?.unit === 'count';
  const allowed = finding.allowed && !counted ? allowedWords(finding.allowed) : null;
  const whyWords = allowed ? `Why ${allowed}` : 'Why';

  const point = (at: boolean): void => store.getState().showFinding(at ? finding.id : null);
  const press = (): void => {
    const piece = pieceOf(store.getState().sheet, finding);
    if (piece) store.getState().select(piece);
    setWhy(!why);
  };

  return (
    <li
      data-status={finding.status}
      className={`py-px ${shown ? 'bg-rule-faint/60' : ''}`}
      onPointerEnter={() => point(true)}
      onPointerLeave={() => point(false)}
      onFocus={() => point(true)}
      onBlur={() => point(false)}
    >
      <button
        type="button"
        aria-expanded={why}
        aria-controls={whyId}
        onClick={press}
        className="pointer-coarse:min-h-11 grid min-h-6 w-full cursor-pointer grid-cols-[1.125rem_minmax(0,1fr)_auto] items-start gap-x-1.5 text-left leading-snug"
      >
        <span className="pt-px">
          <StatusShape status={finding.status} />
        </span>
        <span>
          <span className="sr-only">{STATUS_WORDS[finding.status]}: </span>
          {words}
          {attention && !acts && (
            <span className="ml-2 underline underline-offset-4">{whyWords}</span>
          )}
        </span>
        <strong className={`whitespace-nowrap pl-2 text-lg leading-tight ${ink}`}>
          {lineValue(finding)}
        </strong>
      </button>
      <Gauge finding={finding} />
      {acts && (
        <div className="ml-6 flex flex-wrap items-center gap-x-4 gap-y-1 pb-1">
          <RemedyButton finding={finding} />
          <EnterHere finding={finding} offered={offered} />
          <button
            type="button"
            aria-expanded={why}
            aria-controls={whyId}
            className="pointer-coarse:min-h-11 min-h-8 cursor-pointer underline underline-offset-4"
            onClick={() => setWhy(!why)}
          >
            {whyWords}
          </button>
        </div>
      )}
      {why ? <Why id={whyId} finding={finding} title={title} /> : <span id={whyId} hidden />}
    </li>
  );
}, sameRow);

type RowProps = {
  finding: Finding;
  title: string;
  /** Of what is missing here, that whose field stands in this line. */
  offered: ReadonlySet<Missing>;
};

/** Findings are made anew at each run; a line whose answer is the same is not drawn again. */
function sameRow(a: RowProps, b: RowProps): boolean {
  return (
    a.title === b.title &&
    JSON.stringify(a.finding) === JSON.stringify(b.finding) &&
    [...a.offered].join() === [...b.offered].join()
  );
}

function RemedyButton({ finding }: { finding: Finding }) {
  const apply = useDrawing((s) => s.apply);
  const canDraw = useDrawing((s) => s.canDraw);
  const { remedy } = finding;
  if (!remedy || !canDraw) return null;
  return (
    <Button
      look="action"
      className="pointer-coarse:!min-h-11 !min-h-9 !px-3 font-bold"
      onClick={() => apply(remedy, remedy.words)}
    >
      {remedy.words}
    </Button>
  );
}
