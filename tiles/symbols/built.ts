import { span, stations, step } from '../curves';
import { INKS } from '../inks';
import type { Pen } from '../pen';
import type { Prepared } from '../prepare';
import type { Ft } from '../scene';

export function buildings({ scene }: Prepared, pen: Pen): string[] {
  return scene.buildings
    .filter((building) => pen.shows(building.outline))
    .flatMap(({ outline }) => {
      const width = pen.zoom >= 18 ? 1.4 : 0.8;
      const marks = [pen.area(outline, INKS.building, { stroke: INKS.wall, width })];
      if (pen.zoom >= 19) marks.push(pen.line(ridge(outline), { stroke: INKS.wall, width: 0.8 }));
      return marks;
    });
}

/** The line of a gable roof along the longer way of a four-sided building. */
function ridge(outline: readonly Ft[]): Ft[] {
  const [a, b, c, d] = outline;
  if (!a || !b || !c || !d) return [];
  const half = (p: Ft, q: Ft): Ft => [(p[0] + q[0]) / 2, (p[1] + q[1]) / 2];
  return span(a, b) > span(b, c) ? [half(b, c), half(a, d)] : [half(a, b), half(c, d)];
}

export function tanks({ scene }: Prepared, pen: Pen): string[] {
  return scene.tanks.flatMap(({ at, diameter_ft }) => {
    const rim: Ft[] = [0, 90, 180, 270].map((turn) => step(at, turn, diameter_ft / 2));
    if (!pen.shows(rim)) return [];
    const edge = { stroke: INKS.wall, width: pen.zoom >= 18 ? 1.4 : 0.8 };
    const marks = [pen.disc(at, pen.wide(diameter_ft / 2, 1.5), INKS.tank, edge)];
    if (pen.zoom >= 19) marks.push(pen.disc(at, pen.wide(0.9, 1.5), INKS.wall));
    return marks;
  });
}

export function walls({ scene }: Prepared, pen: Pen): string[] {
  return scene.walls
    .filter((wall) => pen.shows(wall.path))
    .map((wall) => pen.line(wall.path, { stroke: INKS.wall, width: pen.wide(0.8, 1) }));
}

/** A fence as a line with a cross stroke at every tenth foot, a guardrail with its posts. */
export function fences({ scene }: Prepared, pen: Pen): string[] {
  if (pen.zoom < 17) return [];
  const marks = [...scene.fences, ...scene.guardrails]
    .filter(({ path }) => pen.shows(path))
    .map(({ path }) => pen.line(path, { stroke: INKS.fence, width: pen.zoom >= 19 ? 1.2 : 0.8 }));
  if (pen.zoom < 19) return marks;
  for (const { path } of scene.fences) {
    for (const { at, toward_deg } of stations(path, pen.zoom >= 21 ? 10 : 20, 5)) {
      const reach = 4 / pen.pxPerFt;
      const cross: Ft[][] = [45, -45].map((turn) => [
        step(at, toward_deg + turn, reach),
        step(at, toward_deg + turn, -reach),
      ]);
      if (pen.shows([at])) {
        marks.push(...cross.map((line) => pen.line(line, { stroke: INKS.fence, width: 1 })));
      }
    }
  }
  for (const { path } of scene.guardrails) {
    for (const { at } of stations(path, 6.25)) {
      if (pen.shows([at])) marks.push(pen.disc(at, pen.wide(0.3, 1.4), INKS.fence));
    }
  }
  return marks;
}

/** A culvert passes under what it crosses: two broken lines. */
export function culverts({ scene }: Prepared, pen: Pen): string[] {
  if (pen.zoom < 18) return [];
  return scene.culverts.map(({ path }) =>
    pen.line(path, { stroke: INKS.ditchBank, width: pen.wide(2, 1.5), dash: [9, 6] }),
  );
}

export function overhead({ scene }: Prepared, pen: Pen): string[] {
  if (pen.zoom < 17) return [];
  return scene.overhead.flatMap(({ path }) => [
    pen.line(path, { stroke: INKS.wire, width: 0.9 }),
    ...path
      .filter((at) => pen.shows([at]))
      .map((at) => pen.disc(at, pen.wide(0.6, 1.8), INKS.pole)),
  ]);
}
