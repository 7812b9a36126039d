'use client';

import type Konva from 'konva';
import { useEffect, useLayoutEffect, useRef } from 'react';
import { Layer, Shape, Stage } from 'react-konva/lib/ReactKonvaCore.js';
import { paint, THEMES, type DisplayList, type ThemeName } from '@/lib/draw';
import { useView, useViewStore } from './view-store';

type Painted = { readonly list: DisplayList; readonly theme: ThemeName };

/**
 * The canvas over the map: what stays (the site's ground) on one layer, the layout on the next,
 * what comes and goes under the hand on the last, so that each is repainted only when it changes.
 * A pan repaints all of them at once within Leaflet's own event: going through React would show
 * the plan a frame behind the tiles.
 */
export default function PlanStage({
  ground,
  plan,
  hand,
  theme,
  onStands,
}: {
  /** Called once the canvas has been painted. */
  onStands: () => void;
  ground: DisplayList;
  plan: DisplayList;
  hand: DisplayList;
  theme: ThemeName;
}) {
  const width = useView((state) => state.atRest?.size.x ?? 0);
  const height = useView((state) => state.atRest?.size.y ?? 0);
  useEffect(onStands, [onStands]);
  if (width === 0 || height === 0) return null;
  return (
    <Stage width={width} height={height} listening={false} className="pointer-events-none">
      <PaintedLayer list={ground} theme={theme} />
      <PaintedLayer list={plan} theme={theme} />
      <PaintedLayer list={hand} theme={theme} />
    </Stage>
  );
}

function PaintedLayer({ list, theme }: Painted) {
  const layer = useRef<Konva.Layer>(null);
  const painted = useRef<Painted>({ list, theme });
  const views = useViewStore();

  useLayoutEffect(() => {
    painted.current = { list, theme };
    layer.current?.batchDraw();
  }, [list, theme]);

  useLayoutEffect(
    () =>
      views.subscribe((now, before) => {
        if (now.view !== before.view) layer.current?.draw();
      }),
    [views],
  );

  return (
    <Layer ref={layer} listening={false}>
      <Shape
        listening={false}
        perfectDrawEnabled={false}
        sceneFunc={(context) => {
          const { view } = views.getState();
          if (!view) return;
          paint(context._context, painted.current.list, {
            projector: view,
            theme: THEMES[painted.current.theme],
            fontFamily: 'inherit',
            clip: { width: view.size.x, height: view.size.y },
          });
        }}
      />
    </Layer>
  );
}
