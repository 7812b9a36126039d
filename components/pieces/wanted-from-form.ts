import type { LonLat, Vec } from '@/lib/geo';
import {
  pieceSchema,
  placeKey,
  UTILITIES,
  type Kind,
  type Sheet,
  type Utility,
} from '@/lib/layout';
import type { Wanted } from '@/lib/edits';
import { placeByPolar, placeNamed } from './piece-place';
import type { PolarDraft } from './place-fields';
import { readPolar } from './read-polar';

/** What the form for a new piece holds; what its kind does not need is left as it is. */
export type NewPiece = {
  readonly kind: Kind;
  readonly system: string;
  readonly utility: Utility;
  readonly place: PolarDraft;
  /** The other end of a line. */
  readonly end: PolarDraft;
  readonly from: string;
  readonly to: string;
  readonly radiusFt: string;
};

export const UTILITY_CHOICES = UTILITIES;

/** How a kind is placed: between two pieces, at a spot, along a line, round a spot. */
export type Placing = 'between' | 'spot' | 'line' | 'round';

export function placingOf(kind: Kind): Placing {
  if ('from' in pieceSchema(kind).shape) return 'between';
  const key = placeKey(kind);
  if (key === 'at') return 'spot';
  return key === 'rings' ? 'round' : 'line';
}

export type Faults = {
  place?: { bearing?: string; feet?: string };
  end?: { bearing?: string; feet?: string };
  ends?: string;
  radius?: string;
};

export type ReadNewPiece =
  { readonly ok: true; readonly wanted: Wanted } | { readonly ok: false; readonly faults: Faults };

export function wantedFrom(sheet: Sheet, form: NewPiece, radiusFt: number | null): ReadNewPiece {
  const placing = placingOf(form.kind);
  const members = membersOf(form);
  if (placing === 'between') {
    if (form.from === '' || form.to === '') {
      return { ok: false, faults: { ends: 'Choose the two pieces that it joins' } };
    }
    return {
      ok: true,
      wanted: { kind: form.kind, places: [], members, ends: [form.from, form.to] },
    };
  }
  const place = readPolar(form.place);
  const end = placing === 'line' ? readPolar(form.end) : null;
  if (!place.ok || (end && !end.ok)) {
    return {
      ok: false,
      faults: {
        ...(!place.ok && { place: place.faults }),
        ...(end && !end.ok && { end: end.faults }),
      },
    };
  }
  const at = (draft: PolarDraft, polar: typeof place.polar): LonLat => {
    const from: Vec = placeNamed(sheet, draft.from || null);
    return placeByPolar(sheet.layout, from, polar);
  };
  const places = [at(form.place, place.polar), ...(end?.ok ? [at(form.end, end.polar)] : [])];
  return {
    ok: true,
    wanted: {
      kind: form.kind,
      places,
      members,
      ...(placing === 'round' && radiusFt !== null && { radiusFt }),
    },
  };
}

function membersOf({ kind, system, utility }: NewPiece): Record<string, unknown> {
  if (kind === 'buried-line') return { utility };
  if (system === '') return {};
  if (kind === 'rod') return { system };
  return kind === 'z-probe' || kind === 'y-probe' ? { serves: [system] } : {};
}
