'use client';

import { useMemo } from 'react';
import { StatusMark } from '@/components/ui/status-mark';
import { STATUS_WORDS } from '@/components/ui/status';
import { stepEdit, turnEdit } from '@/lib/client/by-keys';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { describe, KIND_WORDS, type Edit } from '@/lib/edits';
import { findPiece, isRun, isSiteKind, isUnit, type Piece } from '@/lib/layout';
import { pieceName, worstFinding } from '../piece-words';
import { FactField } from './fact-field';
import { factsOf, type Fact } from './facts';
import { StepButtons } from './step-buttons';

const PLAIN =
  'min-h-8 cursor-pointer underline decoration-1 underline-offset-4 pointer-coarse:min-h-11';

/** The selected piece: what it is, how it stands, and every fact of it to be changed in place. */
export function StakeTag({ id, roomy = false }: { id: string; roomy?: boolean }) {
  const store = useDrawingStore();
  const sheet = useDrawing((state) => state.sheet);
  const findings = useDrawing((state) => state.findings);
  const canDraw = useDrawing((state) => state.canDraw);
  const canChangeSite = useDrawing((state) => state.canChangeSite);
  const piece = findPiece(sheet, id);
  const worst = useMemo(() => worstFinding(findings, id), [findings, id]);
  if (!piece) return null;

  const may = isSiteKind(piece.kind) ? canChangeSite : canDraw;
  const name = pieceName(sheet, piece);
  const change = (edit: Edit): void => {
    const { apply, history } = store.getState();
    apply(edit, describe(history.present, edit));
  };
  const step = (edit: Edit | null, gesture: string): void => {
    const { apply, history } = store.getState();
    if (edit) apply(edit, describe(history.present, edit), gesture);
  };

  return (
    <section aria-label={`${name}, facts`} className="flex flex-col gap-1.5">
      <header className="flex items-baseline justify-between gap-3">
        <h2 className="text-lg font-bold leading-tight">
          {capital(name)}
          {!name.toLowerCase().includes(KIND_WORDS[piece.kind].toLowerCase()) && (
            <span className="font-normal">, {KIND_WORDS[piece.kind]}</span>
          )}
        </h2>
        <button type="button" className={PLAIN} onClick={() => store.getState().select(null)}>
          Close
        </button>
      </header>
      {worst && worst.status !== 'n/a' && (
        <StatusMark status={worst.status} className="font-semibold">
          {worst.status === 'meets' ? STATUS_WORDS.meets : worst.message}
        </StatusMark>
      )}
      <div className="grid grid-cols-[repeat(auto-fill,minmax(7.25rem,1fr))] gap-x-2.5 gap-y-1">
        {factsOf(piece, sheet.layout).map((fact) => (
          <FactField
            key={fact.member}
            fact={fact}
            value={(piece as Record<string, unknown>)[fact.member]}
            disabled={!may}
            onEnter={(value) => change(editFor(piece, fact, value))}
          />
        ))}
      </div>
      {may && !isRun(piece) && (
        <StepButtons
          name={name}
          roomy={roomy}
          onStep={(bearing, pace) =>
            step(stepEdit(store.getState().history.present, id, bearing, pace), `step ${id}`)
          }
          onTurn={
            isUnit(piece)
              ? (sense) =>
                  step(
                    turnEdit(store.getState().history.present, id, sense, 'coarse'),
                    `turn ${id}`,
                  )
              : null
          }
        />
      )}
      {may && (
        <button
          type="button"
          className={`${PLAIN} self-start text-alarm`}
          onClick={() => {
            change({ type: 'remove', ids: [id] });
            store.getState().select(null);
          }}
        >
          Remove {name}
        </button>
      )}
    </section>
  );
}

function editFor(piece: Piece, fact: Fact, value: unknown): Edit {
  // Turning carries clamps and vents along; a heading that is only set would leave them behind.
  if (fact.member === 'heading_deg' && typeof value === 'number') {
    return { type: 'turn', id: piece.id, heading_deg: value };
  }
  return { type: 'set-piece', id: piece.id, members: { [fact.member]: value } };
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
