'use client';

import { useMemo } from 'react';
import type { LocalPlane } from '@/lib/geo';
import { drawLayout, drawSite, joined } from '@/lib/draw';
import { emptyLayout } from '@/lib/layout';
import { useDrawing } from '@/lib/client/use-drawing';
import { useTheme } from '@/components/ui/use-theme';
import { GlideWith } from './glide-with';
import { PieceButtons } from './piece-buttons';
import { PlanStage } from './plan-stage';
import { PlanWords } from './plan-words';
import { onlyWords, withoutWords } from './split-list';
import { useView } from './view-store';

const NOTHING = { groups: [] };

/** Everything drawn over the tiles, from one display list: shapes on canvas, words as SVG. */
export function PlanOver({ plane }: { plane: LocalPlane }) {
  const theme = useTheme();
  const view = useView((state) => state.atRest);
  const { site, layout } = useDrawing((state) => state.sheet);
  const { origin } = layout;
  const limits = useDrawing((state) => state.limits);
  const findings = useDrawing((state) => state.findings);
  const selection = useDrawing((state) => state.selection);
  const hovered = useDrawing((state) => state.hovered);

  const frame = useMemo(
    () => view && { metresPerPx: view.metresPerPx, bounds: view.bounds },
    [view],
  );
  const ground = useMemo(
    () =>
      // Of the layout the ground needs only the origin: a moving piece must not draw it anew.
      frame ? drawSite({ sheet: { layout: emptyLayout(origin), site }, limits, view: frame }) : NOTHING,
    [site, origin, limits, frame],
  );
  const plan = useMemo(
    () =>
      frame
        ? drawLayout({ sheet: { layout, site }, limits, view: frame, findings, selection, hovered })
        : NOTHING,
    [layout, site, limits, frame, findings, selection, hovered],
  );
  const groundShapes = useMemo(() => withoutWords(ground), [ground]);
  const planShapes = useMemo(() => withoutWords(plan), [plan]);
  const words = useMemo(() => onlyWords(joined(ground, plan)), [ground, plan]);

  if (!view) return null;
  return (
    <>
      <PlanStage ground={groundShapes} plan={planShapes} hand={NOTHING} theme={theme} />
      <GlideWith view={view}>
        <PlanWords list={words} view={view} theme={theme} />
        <PieceButtons plane={plane} view={view} />
      </GlideWith>
    </>
  );
}
