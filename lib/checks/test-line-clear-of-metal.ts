import { angleBetween, feetToMetres, metresToFeet, planeDirection, type Vec } from '../geo';
import { ANSWER_CLASSES, nameOf, planeOf, type SiteGround } from '../layout';
import { DRAWN_WITHIN_FT, OUR_DEFAULT, type LimitValues } from '../limits';
import { answer, atMost, measured } from './support/answer';
import { partWithin } from './support/capsule';
import { forEachLine, lineNotDrawn } from './support/each-line';
import { metalLines, type MetalLines } from './support/ground-lines';
import { missingFrom } from './support/test-line';
import { feet, feetBeside, systemWords } from './support/words';
import type { Check } from './types';

const rule = {
  id: 'test-line-clear-of-metal',
  gate: 'ack',
  backing: {
    mark: OUR_DEFAULT.mark,
    source: `${OUR_DEFAULT.source}; that metal along the line spoils a reading is from memory`,
  },
} as const;

/** Metal that runs with the test line carries the test current: the reading comes out too low. */
export const testLineClearOfMetal: Check = {
  ...rule,
  question: 'Will the test line read true?',
  title: 'Test line clear of metal',
  check({ layout, site, limits }) {
    const metal = metalLines(planeOf(layout), site);
    const nothingDrawn = metal.lines.length === 0;
    const answersOut = ANSWER_CLASSES.some((name) => isOut(site, name));
    return forEachLine(layout, rule, (line) => {
      if (!line.z || !line.centre) return lineNotDrawn(rule, line, missingFrom(line, 'z'));
      if (nothingDrawn && answersOut) {
        return answer(
          rule,
          [line.system],
          'not-known',
          'No metal is drawn, but an owner has not answered',
          {
            missing: ['owner-answer'],
          },
        );
      }
      const longest = longestStretch(metal, line.centre, line.z.at, limits.values);
      const most = limits.values.metal_run_ft;
      const clear = longest.feet <= most + DRAWN_WITHIN_FT.value;
      return answer(
        rule,
        [line.system],
        clear ? 'meets' : 'caution',
        longest.name
          ? `${longest.name} runs ${clear ? feet(longest.feet) : feetBeside(most, longest.feet)} along the test line of ${systemWords(line.system)}, at most ${feet(most)}${clear ? '' : '; turn the line'}`
          : `No metal runs along the test line of ${systemWords(line.system)}`,
        { measured: measured(longest.feet, 'ft'), allowed: atMost(most, 'ft') },
      );
    });
  },
};

function isOut(site: SiteGround, name: (typeof ANSWER_CLASSES)[number]): boolean {
  const given = site.answers[name]?.answer;
  return given !== 'marked' && given !== 'clear';
}

/** The longest unbroken stretch of one line that is near the test line and runs with it. */
function longestStretch(metal: MetalLines, from: Vec, to: Vec, limits: LimitValues) {
  const { index, lines } = metal;
  const near = feetToMetres(limits.metal_near_ft);
  const segments = new Set<number>();
  index.visitBox(
    Math.min(from.x, to.x) - near,
    Math.min(from.y, to.y) - near,
    Math.max(from.x, to.x) + near,
    Math.max(from.y, to.y) + near,
    (segment) => segments.add(segment),
  );
  const direction = planeDirection(from, to);
  let longest = { feet: 0, name: null as string | null };
  let run = { line: -1, segment: -2, metres: 0, open: false };
  // Segments of a line stand in order, so a stretch goes on where the next one begins.
  for (const segment of [...segments].sort((a, b) => a - b)) {
    const [a, b] = endsOf(metal, segment);
    const part = runsWith(a, b, direction, limits.metal_angle_deg)
      ? partWithin(a, b, from, to, near)
      : null;
    if (!part) {
      run = { line: -1, segment, metres: 0, open: false };
      continue;
    }
    const length = Math.hypot(b.x - a.x, b.y - a.y);
    const line = index.lineOf[segment]!;
    const goesOn =
      run.open &&
      run.line === line &&
      run.segment === segment - 1 &&
      part[0] === 0 &&
      sameEnd(metal, segment);
    const metres = (goesOn ? run.metres : 0) + (part[1] - part[0]) * length;
    run = { line, segment, metres, open: part[1] === 1 };
    if (metresToFeet(metres) > longest.feet) {
      const piece = lines[line]!;
      longest = { feet: metresToFeet(metres), name: piece.label ?? wordFor(piece) };
    }
  }
  return longest;
}

const wordFor = (piece: MetalLines['lines'][number]): string =>
  piece.kind === 'metal-line'
    ? `A ${piece.what ?? 'metal line'}`
    : `A ${piece.utility.replaceAll('-', ' ')} line (${nameOf(piece)})`;

function endsOf({ index }: MetalLines, segment: number): [Vec, Vec] {
  const { ends } = index;
  const i = 4 * segment;
  return [
    { x: ends[i]!, y: ends[i + 1]! },
    { x: ends[i + 2]!, y: ends[i + 3]! },
  ];
}

/** Parts of a line in several pieces are listed one after the other but do not touch. */
function sameEnd(metal: MetalLines, segment: number): boolean {
  const [, end] = endsOf(metal, segment - 1);
  const [start] = endsOf(metal, segment);
  return end.x === start.x && end.y === start.y;
}

/** A line has no front: either of its two directions may be near. */
function runsWith(a: Vec, b: Vec, direction: number, withinDeg: number): boolean {
  const turn = angleBetween(planeDirection(a, b), direction);
  return Math.min(turn, 180 - turn) <= withinDeg;
}
