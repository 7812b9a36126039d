'use client';

import { memo, useMemo } from 'react';
import type { Finding } from '@/lib/checks';
import { distance, type LocalPlane, type Vec } from '@/lib/geo';
import { findPiece, placesOf, type Piece, type Sheet } from '@/lib/layout';
import type { Under } from '@/lib/client/tools';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { screenStore } from '../screen-store';
import { pieceSentence, worstFinding } from '../piece-words';
import type { PlanView } from './plan-view';
import { useViewStore } from './view-store';

/** A site may hold thousands of lines; the table has them all, the plan those that are seen. */
const MOST_FEATURES = 100;
const HALF_PX = 22;

/**
 * A real button over every piece: the plan's order for the keyboard and for assistive technology.
 * The pointer goes through them to the plan, which also finds thin lines and what lies beneath.
 */
export function PieceButtons({ plane, view }: { plane: LocalPlane; view: PlanView }) {
  const sheet = useDrawing((state) => state.sheet);
  const findings = useDrawing((state) => state.findings);
  const selection = useDrawing((state) => state.selection);
  const store = useDrawingStore();
  const views = useViewStore();

  const pieces = useMemo(
    () => [...sheet.layout.pieces, ...featuresInView(sheet, plane, view)],
    [sheet, plane, view],
  );

  const bringIntoView = (id: string): void => {
    const { map } = views.getState();
    const piece = findPiece(store.getState().sheet, id);
    if (!map || !piece) return;
    const [lon, lat] = plane.toLonLat(seatOf(placesOf(plane, piece)));
    map.panInside([lat, lon], { padding: [HALF_PX * 2, HALF_PX * 2] });
  };

  return (
    <div role="group" aria-label="Pieces on the plan">
      {pieces.map((piece) => (
        <PieceButton
          key={piece.id}
          piece={piece}
          name={nameOf(sheet, piece, findings)}
          at={inside(view.toPx(seatOf(placesOf(plane, piece))), view)}
          selected={piece.id === selection}
          onSelect={() => {
            store.getState().select(piece.id);
            screenStore.getState().openTag(true);
          }}
          onFocus={() => {
            store.getState().hover(piece.id);
            bringIntoView(piece.id);
          }}
          onBlur={() => store.getState().hover(null)}
        />
      ))}
    </div>
  );
}

const nameOf = (sheet: Sheet, piece: Piece, findings: readonly Finding[]): string =>
  pieceSentence(sheet, piece, worstFinding(findings, piece.id));

const PieceButton = memo(
  function PieceButton({
    piece,
    name,
    at,
    selected,
    onSelect,
    onFocus,
    onBlur,
  }: {
    piece: Piece;
    name: string;
    at: { x: number; y: number };
    selected: boolean;
    onSelect: () => void;
    onFocus: () => void;
    onBlur: () => void;
  }) {
    return (
      <button
        type="button"
        data-piece={piece.id}
        data-kind={piece.kind}
        data-under={JSON.stringify({ type: 'piece', id: piece.id } satisfies Under)}
        aria-label={name}
        aria-pressed={selected}
        onClick={onSelect}
        onFocus={onFocus}
        onBlur={onBlur}
        style={{ left: at.x - HALF_PX, top: at.y - HALF_PX }}
        className="absolute size-11"
      />
    );
  },
  // Handlers read the store when they are called, so old ones do as well as new.
  (was, is) =>
    was.piece.id === is.piece.id &&
    was.name === is.name &&
    was.selected === is.selected &&
    was.at.x === is.at.x &&
    was.at.y === is.at.y,
);

/** Where a piece is taken to be: its point, the middle of its line, its outline's first corner. */
function seatOf(places: readonly (readonly Vec[])[]): Vec {
  const line = places[0] ?? [];
  if (line.length < 2) return line[0] ?? { x: 0, y: 0 };
  const half = line.slice(1).reduce((sum, v, i) => sum + distance(line[i]!, v), 0) / 2;
  let gone = 0;
  for (let i = 1; i < line.length; i++) {
    const [a, b] = [line[i - 1]!, line[i]!];
    const step = distance(a, b);
    if (gone + step >= half) {
      const t = step === 0 ? 0 : (half - gone) / step;
      return { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t };
    }
    gone += step;
  }
  return line.at(-1)!;
}

function featuresInView(sheet: Sheet, plane: LocalPlane, view: PlanView): Piece[] {
  const { min, max } = view.bounds;
  const seen = sheet.site.features.filter((feature) =>
    placesOf(plane, feature).some((line) =>
      line.some((v) => v.x >= min.x && v.x <= max.x && v.y >= min.y && v.y <= max.y),
    ),
  );
  return seen.slice(0, MOST_FEATURES);
}

/** A button beyond the frame would make the browser scroll the plan from under its frame. */
function inside(px: { x: number; y: number }, view: PlanView): { x: number; y: number } {
  const clamp = (value: number, most: number): number =>
    Math.min(Math.max(value, HALF_PX), Math.max(most - HALF_PX, HALF_PX));
  return { x: Math.round(clamp(px.x, view.size.x)), y: Math.round(clamp(px.y, view.size.y)) };
}
