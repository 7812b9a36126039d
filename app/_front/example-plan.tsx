import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { cache } from 'react';
import { PlanShapes } from '@/components/plan/plan-svg';
import { boundsOf, drawSheet, flatProjector, THEMES, type Theme, type Token } from '@/lib/draw';
import { planeAt, positionsOf } from '@/lib/layout';
import { parseExchange } from '@/lib/layout/exchange';

const FILE = join(process.cwd(), 'demo', 'files', 'ramp-plan-a.geojson');
const SIZE = { width: 544, height: 480 } as const;
const ROOM_PX = 64;

/** One drawing for both themes: the browser picks the ink by the page's `color-scheme`. */
const EITHER_THEME = Object.fromEntries(
  (Object.keys(THEMES.paper) as Token[]).map((token) => [
    token,
    `light-dark(${THEMES.paper[token]}, ${THEMES.night[token]})`,
  ]),
) as Theme;

const drawn = cache(async () => {
  const read = parseExchange(JSON.parse(await readFile(FILE, 'utf8')));
  if (!read.ok) throw new Error(`${FILE} has faults`);
  const { sheet, limits } = read;
  const plane = planeAt(sheet.layout.origin);
  // The warm zone reaches far beyond what there is to see; it may be cut by the frame.
  const pieces = sheet.layout.pieces.filter((piece) => piece.kind !== 'warm-zone');
  const seen = boundsOf(pieces.flatMap((piece) => positionsOf(piece).map(plane.toPlane)));
  if (!seen) throw new Error(`${FILE} draws nothing`);
  const { min, max } = seen;
  const pxPerMetre = Math.min(
    (SIZE.width - 2 * ROOM_PX) / (max.x - min.x),
    (SIZE.height - 2 * ROOM_PX) / (max.y - min.y),
  );
  const middle = {
    x: SIZE.width / 2 - ((min.x + max.x) / 2) * pxPerMetre,
    y: SIZE.height / 2 + ((min.y + max.y) / 2) * pxPerMetre,
  };
  return {
    list: drawSheet({ sheet, limits, view: { metresPerPx: 1 / pxPerMetre } }),
    projector: flatProjector(middle, pxPerMetre),
  };
});

/** A layout of the demonstration as the drawing shows it, drawn by the server. */
export async function ExamplePlan() {
  const { list, projector } = await drawn();
  return (
    <figure className="max-xl:hidden">
      <svg
        viewBox={`0 0 ${SIZE.width} ${SIZE.height}`}
        role="img"
        aria-label="A drawn layout: three vehicles, three ground systems, probes and the hot zone"
        className="block w-full border-2 border-ink"
      >
        <PlanShapes list={list} projector={projector} theme={EITHER_THEME} />
      </svg>
      <figcaption className="mt-1 text-ink-soft">
        Plan A of an invented ramp, from the demonstration. North is up.
      </figcaption>
    </figure>
  );
}
