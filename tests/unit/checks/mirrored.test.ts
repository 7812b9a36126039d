import fc from 'fast-check';
import { expect, test } from 'vitest';
import { runChecks, standsFor, type Finding } from '@/lib/checks';
import { angleBetween, localPlane, quantise, type LonLat, type Vec } from '@/lib/geo';
import { pieceSchema, placeKey, type Piece, type Sheet } from '@/lib/layout';
import { anyCase } from '../../odd-sheet';
import { cases, type RandomCase } from '../../random-sheet';

/** A change of the whole scene that the rules must not notice. */
type Motion = { place: (at: Vec) => Vec; direction: (deg: number) => number; mirrored: boolean };

const mirrorEastWest: Motion = {
  place: ({ x, y }) => ({ x: -x, y }),
  direction: (deg) => (360 - deg) % 360,
  mirrored: true,
};
const turned = (by: number): Motion => ({
  place: ({ x, y }) => {
    const turn = (by * Math.PI) / 180;
    return {
      x: x * Math.cos(turn) + y * Math.sin(turn),
      y: y * Math.cos(turn) - x * Math.sin(turn),
    };
  },
  direction: (deg) => (deg + by) % 360,
  mirrored: false,
});

/** A direction that was not entered stays so. */
const moves = (deg: number | null | undefined, motion: Motion): number | null =>
  deg == null ? null : motion.direction(deg);

function moved({ sheet, limits, asOf }: RandomCase, motion: Motion): RandomCase {
  const plane = localPlane(sheet.layout.origin);
  const place = (at: LonLat): LonLat => quantise(plane.toLonLat(motion.place(plane.toPlane(at))));
  const piece = <P extends Piece>(one: P): P => {
    const key = placeKey(one.kind);
    const deep = (value: unknown, isRing: boolean): unknown => {
      if (typeof (value as number[])[0] === 'number') return place(value as unknown as LonLat);
      const list = (value as unknown[]).map((item) => deep(item, isRing));
      // A mirror turns a ring's sense; GeoJSON wants it kept, the rules must not care.
      return motion.mirrored && isRing && typeof (list[0] as number[])[0] === 'number'
        ? list.reverse()
        : list;
    };
    const heading =
      'heading_deg' in pieceSchema(one.kind).shape
        ? { heading_deg: motion.direction((one as { heading_deg?: number }).heading_deg ?? 0) }
        : {};
    const placed = { [key]: deep((one as Record<string, unknown>)[key], key === 'rings') };
    return { ...one, ...placed, ...heading };
  };
  const { wind, slope } = sheet.layout.conditions;
  return {
    limits,
    asOf,
    sheet: {
      layout: {
        ...sheet.layout,
        pieces: sheet.layout.pieces.map(piece),
        conditions: {
          wind: wind && { ...wind, from_deg: moves(wind.from_deg, motion) },
          slope: slope && { ...slope, down_deg: moves(slope.down_deg, motion) },
        },
      },
      site: { ...sheet.site, features: sheet.site.features.map(piece) },
    } as Sheet,
  };
}

/** Within this of a limit, the millimetre that positions are kept to may decide. */
const TIE: Partial<Record<string, number>> = { ft: 0.03, deg: 0.03, ratio: 0.002 };

test.each([
  ['mirrored', mirrorEastWest],
  ['turned by 73°', turned(73)],
])('a layout %s gives the same findings', (_name, motion) => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 1_000_000 }), (seed) => {
      const one = anyCase(seed);
      const other = moved(one, motion);
      const ours = runChecks({ ...one.sheet, ...one });
      const theirs = new Map(runChecks({ ...other.sheet, ...other }).map((f) => [f.id, f]));
      for (const finding of ours) {
        const twin = theirs.get(finding.id);
        if (nearTie(finding)) continue;
        expect(
          twin?.status,
          `seed ${seed}: ${finding.id} ${JSON.stringify(finding.measured)}`,
        ).toBe(finding.status);
        if (finding.measured) {
          const { unit, value } = finding.measured;
          // A ratio of many times carries its lengths' millimetres many times over.
          const within = (TIE[unit] ?? 0) * (unit === 'ratio' ? Math.max(1, value) : 1) + 1e-9;
          expect(Math.abs(twin!.measured!.value - finding.measured.value)).toBeLessThan(within);
        }
      }
      const arc = standsFor({ ...one.sheet, ...one });
      const twinArc = standsFor({ ...other.sheet, ...other });
      expect(twinArc === null).toBe(arc === null);
      if (arc && twinArc) {
        const [from, to] = motion.mirrored
          ? [arc.to_deg, arc.from_deg]
          : [arc.from_deg, arc.to_deg];
        expect(angleBetween(twinArc.from_deg, motion.direction(from))).toBeLessThan(0.05);
        expect(angleBetween(twinArc.to_deg, motion.direction(to))).toBeLessThan(0.05);
      }
    }),
    { numRuns: cases(1000), seed: 4 },
  );
});

function nearTie({ measured, allowed, rule }: Finding): boolean {
  if (!measured) return false;
  // These have ends of their own besides the band that is shown, or list lines within 30 ft.
  if (rule === 'upwind' || rule === 'uphill')
    return [90, allowed?.max ?? 90].some((end) => Math.abs(measured.value - end) < 0.1);
  if (rule === 'clear-of-buried-lines' && Math.abs(measured.value - 30) < 0.1) return true;
  const within = 3 * (TIE[measured.unit] ?? 0);
  const ends = [allowed?.min, allowed?.max, 0, 0.45, 0.75, 1.5].filter((end) => end != null);
  return ends.some((end) =>
    [0, 0.05, -0.05].some((drawn) => Math.abs(measured.value - (end as number) + drawn) < within),
  );
}
