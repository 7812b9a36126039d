'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input, Select } from '@/components/ui/field';
import { parseNumber } from '@/components/conditions/parse-number';
import { newPieceId } from '@/components/drawing/new-piece-id';
import { pieceName } from '@/components/drawing/piece-words';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { bring, describe, EditError, KIND_WORDS } from '@/lib/edits';
import {
  isSiteKind,
  LAYOUT_KINDS,
  SITE_KINDS,
  SYSTEMS,
  type Kind,
  type Utility,
} from '@/lib/layout';
import { EndFields } from './end-fields';
import { NO_POLAR, PlaceFields } from './place-fields';
import {
  placingOf,
  UTILITY_CHOICES,
  wantedFrom,
  type Faults,
  type NewPiece,
} from './wanted-from-form';

const KINDS: readonly Kind[] = [...LAYOUT_KINDS, ...SITE_KINDS];
const OF_A_SYSTEM: ReadonlySet<Kind> = new Set(['rod', 'z-probe', 'y-probe']);
const MOST_RADIUS_FT = 5000;

const BLANK: NewPiece = {
  kind: 'rod',
  system: '',
  utility: 'electric',
  place: NO_POLAR,
  end: NO_POLAR,
  from: '',
  to: '',
  radiusFt: '',
};

/** A new piece without the plan: what it is, and where by bearing and distance. */
export function AddPiece() {
  const store = useDrawingStore();
  const canChangeSite = useDrawing((s) => s.canChangeSite);
  const [form, setForm] = useState<NewPiece>(BLANK);
  const [faults, setFaults] = useState<Faults>({});
  const change = (members: Partial<NewPiece>): void => setForm({ ...form, ...members });
  const placing = placingOf(form.kind);

  const add = (event: FormEvent): void => {
    event.preventDefault();
    const radius = parseNumber(form.radiusFt, 1, MOST_RADIUS_FT);
    if (placing === 'round' && 'fault' in radius) return setFaults({ radius: radius.fault });
    const { sheet, limits, apply, complain, select, announce } = store.getState();
    const read = wantedFrom(sheet, form, 'value' in radius ? radius.value : null);
    setFaults(read.ok ? {} : read.faults);
    if (!read.ok) return;
    try {
      const edit = bring(sheet, read.wanted, { newId: newPieceId, limits: limits.values });
      if (!apply(edit, describe(sheet, edit))) return;
      const [placed, ...along] = edit.pieces;
      if (!placed) return;
      select(placed.id);
      const more = along.length === 0 ? '' : `, with ${along.length} that belong to it`;
      announce(`${pieceName(store.getState().sheet, placed)} placed${more}`);
    } catch (error) {
      if (!(error instanceof EditError)) throw error;
      complain(error.message);
    }
  };

  return (
    <form onSubmit={add} noValidate className="flex flex-wrap items-end gap-x-4 gap-y-2">
      <Field label="Kind" className="w-48">
        {(ties) => (
          <Select
            {...ties}
            value={form.kind}
            onChange={(event) => change({ kind: event.target.value as Kind })}
          >
            {KINDS.filter((kind) => canChangeSite || !isSiteKind(kind)).map((kind) => (
              <option key={kind} value={kind}>
                {KIND_WORDS[kind]}
              </option>
            ))}
          </Select>
        )}
      </Field>
      {OF_A_SYSTEM.has(form.kind) && (
        <Field label="System" className="w-36">
          {(ties) => (
            <Select
              {...ties}
              value={form.system}
              onChange={(event) => change({ system: event.target.value })}
            >
              <option value="">as it lies</option>
              {SYSTEMS.map((system) => (
                <option key={system}>{system}</option>
              ))}
            </Select>
          )}
        </Field>
      )}
      {form.kind === 'buried-line' && (
        <Field label="Class" className="w-48">
          {(ties) => (
            <Select
              {...ties}
              value={form.utility}
              onChange={(event) => change({ utility: event.target.value as Utility })}
            >
              {UTILITY_CHOICES.map((utility) => (
                <option key={utility} value={utility}>
                  {utility.replaceAll('-', ' ')}
                </option>
              ))}
            </Select>
          )}
        </Field>
      )}
      {placing === 'between' ? (
        <EndFields
          kind={form.kind}
          from={form.from}
          to={form.to}
          fault={faults.ends}
          onChange={change}
        />
      ) : (
        <PlaceFields
          legend={placing === 'line' ? 'One end' : placing === 'round' ? 'Its middle' : 'Its place'}
          draft={form.place}
          faults={faults.place ?? {}}
          onChange={(place) => change({ place })}
        />
      )}
      {placing === 'line' && (
        <PlaceFields
          legend="The other end"
          draft={form.end}
          faults={faults.end ?? {}}
          onChange={(end) => change({ end })}
        />
      )}
      {placing === 'round' && (
        <Field label="Radius ft" error={faults.radius} className="w-28">
          {(ties) => (
            <Input
              {...ties}
              inputMode="decimal"
              autoComplete="off"
              value={form.radiusFt}
              onChange={(event) => change({ radiusFt: event.target.value })}
            />
          )}
        </Field>
      )}
      <Button type="submit" look="action">
        Place {KIND_WORDS[form.kind]}
      </Button>
    </form>
  );
}
