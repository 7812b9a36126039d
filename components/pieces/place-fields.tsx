'use client';

import { useId, useMemo, type ReactNode } from 'react';
import { Field, Input, Select } from '@/components/ui/field';
import { pieceName } from '@/components/drawing/piece-words';
import { useDrawing } from '@/lib/client/use-drawing';
import { isRun, type Piece } from '@/lib/layout';
import { referenceOf } from './piece-place';

/** A place by bearing and distance, as its three fields hold it until it is read. */
export type PolarDraft = { readonly from: string; readonly bearing: string; readonly feet: string };

export const NO_POLAR: PolarDraft = { from: '', bearing: '', feet: '' };

/** "From R1, 135°, 4 ft": the way a place is said over a radio and laid out with a tape. */
export function PlaceFields({
  draft,
  faults,
  not,
  legend,
  onChange,
}: {
  draft: PolarDraft;
  faults: { readonly bearing?: string; readonly feet?: string };
  /** A piece is not placed from itself. */
  not?: string;
  legend: ReactNode;
  onChange: (draft: PolarDraft) => void;
}) {
  const sheet = useDrawing((s) => s.sheet);
  const legendId = useId();
  const reference = referenceOf(sheet.layout).words;
  const choices = useMemo(
    () =>
      [...sheet.layout.pieces, ...sheet.site.features]
        .filter((piece: Piece) => piece.id !== not && !isRun(piece))
        .map((piece) => ({ id: piece.id, name: pieceName(sheet, piece) })),
    [sheet, not],
  );
  return (
    <div role="group" aria-labelledby={legendId}>
      <p id={legendId} className="text-ink-soft">
        {legend}
      </p>
      <div className="flex flex-wrap items-start gap-x-3 gap-y-1">
        <Field label="From" className="w-48">
          {(ties) => (
            <Select
              {...ties}
              value={draft.from}
              onChange={(event) => onChange({ ...draft, from: event.target.value })}
            >
              <option value="">{reference}</option>
              {choices.map(({ id, name }) => (
                <option key={id} value={id}>
                  {name}
                </option>
              ))}
            </Select>
          )}
        </Field>
        <Field label="Bearing °" error={faults.bearing} className="w-28">
          {(ties) => (
            <Input
              {...ties}
              inputMode="decimal"
              autoComplete="off"
              value={draft.bearing}
              onChange={(event) => onChange({ ...draft, bearing: event.target.value })}
            />
          )}
        </Field>
        <Field label="Distance ft" error={faults.feet} className="w-28">
          {(ties) => (
            <Input
              {...ties}
              inputMode="decimal"
              autoComplete="off"
              value={draft.feet}
              onChange={(event) => onChange({ ...draft, feet: event.target.value })}
            />
          )}
        </Field>
      </div>
    </div>
  );
}
