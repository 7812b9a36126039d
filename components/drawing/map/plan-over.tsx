'use client';

import dynamic from 'next/dynamic';
import { useCallback, useMemo, useState } from 'react';
import { useMap } from 'react-leaflet';
import { handleAt, handlesOf } from '@/lib/client/handles';
import { piecesAt, REACH_PX } from '@/lib/client/hit-test';
import { guideOf, type Under } from '@/lib/client/tools';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { drawGrid, drawLayout, drawSite, joined, type Bounds } from '@/lib/draw';
import type { LocalPlane } from '@/lib/geo';
import { emptyLayout, findPiece, isSiteKind, unitOf } from '@/lib/layout';
import { useTheme } from '@/components/ui/use-theme';
import { keepTrying } from '../keep-trying';
import { pieceName } from '../piece-words';
import { GlideWith } from './glide-with';
import { handList, jumperBand } from './hand-list';
import { HandleButtons } from './handle-buttons';
import { PieceButtons } from './piece-buttons';
import { PlanWords } from './plan-words';
import { onlyWords, withoutWords } from './split-list';
import { usePlanFocus } from './use-plan-focus';
import { usePlanKeys } from './use-plan-keys';
import { usePlanPointer } from './use-plan-pointer';
import { sceneOf, usePlanTool } from './use-plan-tool';
import { useView, useViewStore } from './view-store';

/** The canvas comes after the plan answers; until then all of the list is painted as SVG. */
const PlanStage = dynamic(() => keepTrying(() => import('./plan-stage')), { ssr: false });

const NOTHING = { groups: [] };
/** Handles are small; a mouse may miss them by this much, px. */
const HANDLE_REACH_PX = 10;

/** Everything drawn over the tiles, from one display list: shapes on canvas, words as SVG. */
export function PlanOver({ plane }: { plane: LocalPlane }) {
  const map = useMap();
  const store = useDrawingStore();
  const views = useViewStore();
  const theme = useTheme();
  const view = useView((state) => state.atRest);
  const sheet = useDrawing((state) => state.sheet);
  const limits = useDrawing((state) => state.limits);
  const findings = useDrawing((state) => state.findings);
  const selection = useDrawing((state) => state.selection);
  const hovered = useDrawing((state) => state.hovered);
  const mayDraw = useDrawing((state) => state.canDraw);
  const mayChangeSite = useDrawing((state) => state.canChangeSite);
  const moving = useDrawing((state) => state.preview !== null);
  const hasBaseMap = useDrawing((state) => state.meta.baseMap !== null);
  const tool = usePlanTool();
  const { site, layout } = sheet;
  const { origin } = layout;

  const casualty = unitOf(layout, 'C');
  const from = useMemo(
    () => (casualty ? plane.toPlane(casualty.at) : { x: 0, y: 0 }),
    [casualty, plane],
  );
  const frame = useMemo(
    () => view && { metresPerPx: view.metresPerPx, bounds: view.bounds },
    [view],
  );
  const ground = useMemo(
    () =>
      // Of the layout the ground needs only the origin: a moving piece must not draw it anew.
      frame
        ? drawSite({ sheet: { layout: emptyLayout(origin), site }, limits, view: frame })
        : NOTHING,
    [site, origin, limits, frame],
  );
  const grid = useMemo(
    () =>
      frame && !hasBaseMap
        ? drawGrid({ ...frame, bounds: widened(frame.bounds) }, 'ft', from)
        : NOTHING,
    [frame, hasBaseMap, from],
  );
  const plan = useMemo(
    () =>
      frame
        ? drawLayout({ sheet, limits, view: frame, findings, selection, hovered }, ground)
        : NOTHING,
    [sheet, limits, frame, findings, selection, hovered, ground],
  );

  const selected = selection === null ? null : findPiece(sheet, selection);
  const handles = useMemo(() => {
    if (!selected || !frame) return [];
    const may = isSiteKind(selected.kind) ? mayChangeSite : mayDraw;
    return may ? handlesOf(plane, selected, frame.metresPerPx) : [];
  }, [selected, frame, plane, mayDraw, mayChangeSite]);

  const guide = guideOf(tool.state, sceneOf(store.getState()));
  const band =
    moving && selected?.kind === 'rod' ? jumperBand(sheet, selected, plane, limits) : null;
  const hand = handList(handles, guide, band, plane);

  const groundShapes = useMemo(() => withoutWords(joined(grid, ground)), [grid, ground]);
  const planShapes = useMemo(() => withoutWords(plan), [plan]);
  const [canvasStands, setCanvasStands] = useState(false);
  const onStands = useCallback(() => setCanvasStands(true), []);
  const words = useMemo(
    () => (canvasStands ? onlyWords(joined(ground, plan)) : joined(grid, ground, plan)),
    [canvasStands, grid, ground, plan],
  );

  const find = useCallback(
    (...[at, metresPerPx, pointer]: Parameters<Parameters<typeof usePlanPointer>[3]['find']>) => {
      const reach = Math.max(HANDLE_REACH_PX, REACH_PX[pointer]) * metresPerPx;
      const handle = handleAt(handles, at, reach);
      if (handle) return handle.under;
      const [id] = piecesAt([plan, ground], at, metresPerPx, pointer);
      return id === undefined ? null : ({ type: 'piece', id } satisfies Under);
    },
    [handles, plan, ground],
  );
  usePlanPointer(map, views, plane, {
    send: tool.send,
    find,
    onHover(under) {
      const id = under?.type === 'piece' ? under.id : null;
      if (id !== store.getState().hovered) store.getState().hover(id);
      const { inHand } = store.getState();
      map.getContainer().style.cursor = inHand ? 'crosshair' : under ? 'pointer' : '';
    },
  });
  usePlanKeys(map, views, plane, tool.send);
  usePlanFocus(map, views, plane);

  if (!view) return null;
  return (
    <>
      <PlanStage
        ground={groundShapes}
        plan={planShapes}
        hand={hand}
        theme={theme}
        onStands={onStands}
      />
      <GlideWith view={view}>
        <PlanWords list={words} view={view} theme={theme} />
        <PieceButtons plane={plane} view={view} />
        {selected && (
          <HandleButtons handles={handles} name={pieceName(sheet, selected)} view={view} />
        )}
      </GlideWith>
    </>
  );
}

/** As much again on every side, so that a pan does not run off the grid before it rests. */
function widened({ min, max }: Bounds): Bounds {
  const [w, h] = [max.x - min.x, max.y - min.y];
  return { min: { x: min.x - w, y: min.y - h }, max: { x: max.x + w, y: max.y + h } };
}
