'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { NumberEntry } from '@/components/conditions/number-entry';
import { pieceName } from '@/components/drawing/piece-words';
import { formatPosition, parsePosition, type LonLat } from '@/lib/geo';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { findPiece, isUnit, type Piece } from '@/lib/layout';
import {
  anchorFor,
  canBeMoved,
  middleOf,
  placeByPolar,
  placeNamed,
  polarFrom,
  referenceOf,
} from './piece-place';
import { PlaceFields, type PolarDraft } from './place-fields';
import { readPolar } from './read-polar';

/** Puts one piece elsewhere by bearing and distance or by coordinates, turns it, or takes it away. */
export function ChangePlace({ id, onDone }: { id: string; onDone: () => void }) {
  const piece = useDrawing((s) => findPiece(s.sheet, id));
  if (!piece) return null;
  return (
    <div className="flex flex-wrap items-end gap-x-8 gap-y-3 py-2">
      {canBeMoved(piece) ? (
        <>
          <ByPolar piece={piece} />
          <ByCoordinates piece={piece} />
          {isUnit(piece) && <Heading id={id} heading={piece.heading_deg ?? 0} />}
        </>
      ) : (
        <p>It lies between the two pieces that it joins. Move those.</p>
      )}
      <Remove piece={piece} onDone={onDone} />
    </div>
  );
}

function useMoveTo(piece: Piece): (middle: LonLat) => void {
  const store = useDrawingStore();
  return (middle) => {
    const { sheet, apply, announce } = store.getState();
    const to = anchorFor(sheet.layout, piece, middle);
    const name = pieceName(sheet, piece);
    if (apply({ type: 'move', moves: [{ id: piece.id, to }] }, `Move ${name}`)) {
      announce(`${name} moved`);
    }
  };
}

function ByPolar({ piece }: { piece: Piece }) {
  const store = useDrawingStore();
  const layout = useDrawing((s) => s.sheet.layout);
  const moveTo = useMoveTo(piece);
  const now = polarFrom(layout, referenceOf(layout).at, middleOf(layout, piece));
  const [draft, setDraft] = useState<PolarDraft>({
    from: '',
    bearing: now.bearingDeg.toFixed(1),
    feet: now.feet.toFixed(1),
  });
  const [faults, setFaults] = useState<{ bearing?: string; feet?: string }>({});

  const move = (event: FormEvent): void => {
    event.preventDefault();
    const read = readPolar(draft);
    setFaults(read.ok ? {} : read.faults);
    if (!read.ok) return;
    const { sheet } = store.getState();
    const from = placeNamed(sheet, draft.from || null);
    moveTo(placeByPolar(sheet.layout, from, read.polar));
  };

  return (
    <form onSubmit={move} noValidate className="flex flex-wrap items-end gap-3">
      <PlaceFields
        legend="By bearing and distance"
        draft={draft}
        faults={faults}
        not={piece.id}
        onChange={setDraft}
      />
      <Button type="submit">Move there</Button>
    </form>
  );
}

function ByCoordinates({ piece }: { piece: Piece }) {
  const layout = useDrawing((s) => s.sheet.layout);
  const moveTo = useMoveTo(piece);
  const [draft, setDraft] = useState<string | null>(null);
  const [fault, setFault] = useState<string | undefined>(undefined);
  const now = formatPosition(placeByPolar(layout, middleOf(layout, piece), STILL), 'decimal');

  const move = (event: FormEvent): void => {
    event.preventDefault();
    const read = parsePosition(draft ?? now);
    setFault(read.ok ? undefined : read.message);
    if (!read.ok) return;
    setDraft(null);
    moveTo(read.place);
  };

  return (
    <form onSubmit={move} noValidate className="flex flex-wrap items-end gap-3">
      <Field label="Latitude, longitude" error={fault} className="w-72">
        {(ties) => (
          <Input
            {...ties}
            autoComplete="off"
            value={draft ?? now}
            onChange={(event) => setDraft(event.target.value)}
          />
        )}
      </Field>
      <Button type="submit">Move there</Button>
    </form>
  );
}

const STILL = { bearingDeg: 0, feet: 0 };

function Heading({ id, heading }: { id: string; heading: number }) {
  const store = useDrawingStore();
  return (
    <NumberEntry
      label="Front to"
      unit="°"
      className="w-32"
      value={heading}
      decimals={1}
      least={0}
      most={360}
      onEnter={(degrees) => {
        const { sheet, apply } = store.getState();
        const piece = findPiece(sheet, id);
        if (piece) {
          apply({ type: 'turn', id, heading_deg: degrees ?? 0 }, `Turn ${pieceName(sheet, piece)}`);
        }
      }}
    />
  );
}

function Remove({ piece, onDone }: { piece: Piece; onDone: () => void }) {
  const store = useDrawingStore();
  return (
    <Button
      look="alarm"
      className="ml-auto"
      onClick={() => {
        const { sheet, apply, select, announce } = store.getState();
        const name = pieceName(sheet, piece);
        if (!apply({ type: 'remove', ids: [piece.id] }, `Remove ${name}`)) return;
        select(null);
        announce(`${name} removed. Undo brings it back.`);
        onDone();
      }}
    >
      Remove
    </Button>
  );
}
