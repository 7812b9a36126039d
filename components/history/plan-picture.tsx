'use client';

import { useEffect, useMemo, useRef, useState } from 'react';
import { PlanShapes } from '@/components/plan/plan-svg';
import { useTheme } from '@/components/ui/use-theme';
import { boundsOf, drawSheet, flatProjector } from '@/lib/draw';
import {
  isUnit,
  planeAt,
  positionsOf,
  unitSizeFt,
  type Layout,
  type Sheet,
  type SiteGround,
} from '@/lib/layout';
import { feetToMetres } from '@/lib/geo';
import type { Limits } from '@/lib/limits';

/** Px kept free round the drawing, for labels that stand outside what they name. */
const ROOM_PX = 56;
/** A lone piece is shown with this much ground round it, metres. */
const LEAST_METRES = 12;

/** A sheet as a still picture, north up, as large as its place allows. Read only. */
export function PlanPicture({
  layout,
  ground: site,
  limits,
  describedAs,
}: {
  layout: Layout;
  ground: SiteGround;
  limits: Limits;
  describedAs: string;
}) {
  const sheet = useMemo(() => ({ layout, site }), [layout, site]);
  const theme = useTheme();
  const { box, width, height } = useSize();
  const ground = useMemo(() => groundOf(sheet), [sheet]);
  const scale =
    ground &&
    Math.min((width - 2 * ROOM_PX) / ground.width, (height - 2 * ROOM_PX) / ground.height);
  const list = useMemo(
    () =>
      scale && scale > 0 ? drawSheet({ sheet, limits, view: { metresPerPx: 1 / scale } }) : null,
    [sheet, limits, scale],
  );
  return (
    <div
      ref={box}
      className="relative h-[26rem] overflow-hidden border-2 border-ink bg-paper lg:h-[34rem]"
    >
      {ground && list && scale ? (
        <svg width={width} height={height} role="img" aria-label={describedAs} className="block">
          <PlanShapes
            list={list}
            theme={theme}
            projector={flatProjector(
              { x: width / 2 - ground.middle.x * scale, y: height / 2 + ground.middle.y * scale },
              scale,
            )}
          />
        </svg>
      ) : (
        !ground && <p className="p-4">Nothing is drawn in this version.</p>
      )}
    </div>
  );
}

/** What has to be seen: every piece of the layout, vehicles to their ends. */
function groundOf(sheet: Sheet) {
  const plane = planeAt(sheet.layout.origin);
  const places = sheet.layout.pieces.flatMap((piece) => {
    const at = positionsOf(piece).map(plane.toPlane);
    if (!isUnit(piece)) return at;
    const reach = feetToMetres(unitSizeFt(piece).length) / 2;
    return at.flatMap(({ x, y }) => [
      { x: x - reach, y: y - reach },
      { x: x + reach, y: y + reach },
    ]);
  });
  const bounds = boundsOf(places);
  if (!bounds) return null;
  const { min, max } = bounds;
  return {
    middle: { x: (min.x + max.x) / 2, y: (min.y + max.y) / 2 },
    width: Math.max(LEAST_METRES, max.x - min.x),
    height: Math.max(LEAST_METRES, max.y - min.y),
  };
}

function useSize() {
  const box = useRef<HTMLDivElement>(null);
  const [size, setSize] = useState({ width: 0, height: 0 });
  useEffect(() => {
    if (!box.current) return;
    const watch = new ResizeObserver(([entry]) => {
      if (entry) setSize({ width: entry.contentRect.width, height: entry.contentRect.height });
    });
    watch.observe(box.current);
    return () => watch.disconnect();
  }, []);
  return { box, ...size };
}
