'use client';

import { useMemo, useState } from 'react';
import { CHECKS, type Finding, type Missing } from '@/lib/checks';
import { Button } from '@/components/ui/button';
import { STATUS_INK } from '@/components/ui/status';
import { StatusShape } from '@/components/ui/status-mark';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { EnterHere } from './enter/enter-here';
import { Gauge } from './gauge';
import { groupFindings } from './group-findings';
import { lineWords, pieceOf } from './line-words';
import { rankOf } from './count-findings';

/**
 * One check at a time, for a hand in a glove: what is wrong, one large button that puts it right,
 * and Next. With a piece given, only what the checks say of that piece.
 */
export function CheckStepper({ pieceId = null }: { pieceId?: string | null }) {
  const findings = useDrawing((s) => s.findings);
  const store = useDrawingStore();
  const open = useMemo(() => openFindings(findings, pieceId), [findings, pieceId]);
  const [shownId, setShownId] = useState<string | null>(null);
  // Remedied findings go from the list; where that was the one shown, the next takes its place.
  const at = Math.max(
    0,
    open.findIndex((finding) => finding.id === shownId),
  );
  const finding = open[at];

  const go = (to: number): void => {
    const next = open[(to + open.length) % open.length];
    if (!next) return;
    setShownId(next.id);
    const { sheet, select, showFinding } = store.getState();
    const piece = pieceOf(sheet, next);
    if (pieceId === null && piece) select(piece);
    showFinding(next.id);
  };

  if (!finding) return <p className="py-2 text-lg font-bold">Nothing open here.</p>;
  return (
    <section aria-label="One check at a time" className="space-y-2">
      <div className="flex items-center justify-between gap-3">
        <p aria-live="polite">
          Check {at + 1} of {open.length}
        </p>
        {open.length > 1 && (
          <span className="flex gap-2">
            <Button size="field" onClick={() => go(at - 1)}>
              Back
            </Button>
            <Button size="field" onClick={() => go(at + 1)}>
              Next
            </Button>
          </span>
        )}
      </div>
      <Sentence finding={finding} />
      <Gauge finding={finding} />
      <Remedy finding={finding} />
      <EnterHere finding={finding} offered={new Set<Missing>(finding.missing)} />
    </section>
  );
}

function openFindings(findings: readonly Finding[], pieceId: string | null): Finding[] {
  const about = pieceId
    ? findings.filter((finding) => finding.subjects.includes(pieceId))
    : findings;
  const { groups } = groupFindings(about, CHECKS, 'attention');
  return groups
    .flatMap(({ rows }) => rows.flatMap((row) => row.findings))
    .sort((a, b) => rankOf(a.status) - rankOf(b.status));
}

function Sentence({ finding }: { finding: Finding }) {
  const words = useDrawing((s) => lineWords(s.sheet, finding));
  return (
    <p className={`text-lg font-bold leading-snug ${STATUS_INK[finding.status]}`}>
      <StatusShape status={finding.status} /> {words}
    </p>
  );
}

function Remedy({ finding: { remedy } }: { finding: Finding }) {
  const apply = useDrawing((s) => s.apply);
  const canDraw = useDrawing((s) => s.canDraw);
  if (!remedy || !canDraw) return null;
  return (
    <Button
      look="action"
      size="field"
      className="w-full"
      onClick={() => apply(remedy, remedy.words)}
    >
      {remedy.words}
    </Button>
  );
}
