import { distance, meanOf, metresToFeet, type Vec } from '../../geo';
import {
  placeOf,
  planeOf,
  probeFor,
  rodDrivenFt,
  rodsOf,
  type Layout,
  type Probe,
  type Rod,
  type System,
} from '../../layout';

/** A system's test line: from the mean place of its rods through Y to Z, as far as drawn. */
export type TestLine = {
  readonly system: System;
  readonly rods: readonly Rod[];
  /** Mean place of the rods; null without rods. */
  readonly centre: Vec | null;
  readonly z: { readonly probe: Probe; readonly at: Vec; readonly metres: number } | null;
  readonly y: { readonly probe: Probe; readonly at: Vec; readonly metres: number } | null;
};

export function testLineOf(layout: Layout, system: System): TestLine {
  const plane = planeOf(layout);
  const rods = rodsOf(layout, system);
  const centre = meanOf(rods.map((rod) => placeOf(plane, rod)));
  const reach = (kind: 'z-probe' | 'y-probe') => {
    const probe = probeFor(layout, kind, system);
    if (!probe || !centre) return null;
    const at = placeOf(plane, probe);
    return { probe, at, metres: distance(centre, at) };
  };
  return { system, rods, centre, z: reach('z-probe'), y: reach('y-probe') };
}

/** Y distance over Z distance; null where either is not drawn, or Z stands on the system. */
export function yRatio(line: TestLine): number | null {
  return line.z && line.y && line.z.metres > 0 ? line.y.metres / line.z.metres : null;
}

/** The farthest two rods are apart, or the longest driven length if that is more; feet. */
export function extentFt(layout: Layout, line: TestLine): number {
  const plane = planeOf(layout);
  const places = line.rods.map((rod) => placeOf(plane, rod));
  const apart = places.flatMap((a, i) =>
    places.slice(i + 1).map((b) => metresToFeet(distance(a, b))),
  );
  return Math.max(0, ...apart, ...line.rods.map(rodDrivenFt));
}

/** What is missing for the line to be measured, in words for a message. */
export function missingFrom(line: TestLine, ...wanted: ('z' | 'y')[]): string | null {
  const lacks = [
    ...(line.rods.length === 0 ? ['no rod'] : []),
    ...(wanted.includes('z') && !probeShown(line, 'z') ? ['no Z'] : []),
    ...(wanted.includes('y') && !probeShown(line, 'y') ? ['no Y'] : []),
  ];
  return lacks.length > 0 ? lacks.join(' and ') : null;
}

const probeShown = (line: TestLine, which: 'z' | 'y'): boolean =>
  line[which] !== null || line.centre === null;
