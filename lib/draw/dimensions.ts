import type { Finding } from '../checks';
import type { TestLine } from '../checks/support/test-line';
import { feetToMetres, planeDirection, turnBetween } from '../geo';
import { systemsInUse } from '../layout';
import { BURIED_REPORT_WITHIN_FT } from '../limits';
import type { Clutter } from './clutter';
import { apart, dimensionEnds, systemsApart } from './dimension-ends';
import { dimensionMarks, type Dimension } from './dimension-mark';
import type { Frame } from './frame';
import type { Group } from './types';
import { lengthWords } from './words';

type Asked = {
  readonly findings: readonly Finding[];
  /** Pieces in the hand or under the pointer: every distance of theirs is shown. */
  readonly focus: readonly string[];
  readonly tests: readonly TestLine[];
};

/** The distances that matter: what fails, what is in hand, and what a tape will be laid along. */
export function drawDimensions(frame: Frame, asked: Asked, clutter: Clutter): Group[] {
  const plain = [...probeDimensions(frame, asked), ...systemDimensions(frame)];
  const byId = new Map<string, Dimension>();
  for (const dimension of fromFindings(frame, asked)) {
    // Where the same distance is drawn anyway, it stays in its place and only gains weight.
    const usual = plain.find(({ id }) => id === dimension.id);
    byId.set(dimension.id, usual ? { ...usual, weight: dimension.weight } : dimension);
  }
  for (const dimension of plain) {
    if (!byId.has(dimension.id)) byId.set(dimension.id, dimension);
  }
  return [...byId.values()].map((dimension) => ({
    id: `~${dimension.id}`,
    layer: 'dimension',
    marks: dimensionMarks(frame, dimension, clutter),
  }));
}

/** Rules whose distance helps while a piece is placed; the others show when they are not met. */
const SHOWN_IN_HAND = [
  'rods-apart',
  'systems-apart',
  'outside-hot-zone',
  'z-distance',
  'y-distance',
];

/** Not met always; what else was measured only for the piece in hand. */
function fromFindings(frame: Frame, { findings, focus, tests }: Asked): Dimension[] {
  const systems = tests
    .filter((test) => testPieces(test).some((id) => focus.includes(id)))
    .map(({ system }): string => system);
  const isShown = ({ rule, status, subjects, measured }: Finding): boolean => {
    if (status === 'not-met') return true;
    if (!subjects.some((subject) => focus.includes(subject) || systems.includes(subject))) {
      return false;
    }
    const near = measured !== null && measured.value <= BURIED_REPORT_WITHIN_FT.value;
    return SHOWN_IN_HAND.includes(rule) || (rule === 'clear-of-buried-lines' && near);
  };
  return findings
    .filter(isShown)
    .sort((a, b) => rank(a) - rank(b))
    .flatMap((finding): Dimension[] => {
      const ends = dimensionEnds(frame, finding);
      if (!ends || !finding.measured) return [];
      const metres = feetToMetres(Math.abs(finding.measured.value));
      const inside = finding.measured.value < 0 ? ' inside' : '';
      return [
        {
          id: `${finding.rule}|${finding.subjects.join(',')}`,
          ends,
          text: `${lengthWords(metres, frame.units)}${inside}`,
          weight:
            finding.status === 'not-met' || finding.status === 'caution' ? finding.status : 'plain',
          asidePx: null,
        },
      ];
    });
}

const rank = ({ status }: Finding): number =>
  status === 'not-met' ? 0 : status === 'caution' ? 1 : 2;

const testPieces = ({ rods, z, y }: TestLine): string[] => [
  ...rods.map((rod) => rod.id),
  ...(z ? [z.probe.id] : []),
  ...(y ? [y.probe.id] : []),
];

/** Z and Y distances on the two outer test lines, outside the fan, where nothing else lies. */
function probeDimensions(frame: Frame, { tests }: Asked): Dimension[] {
  const fans = tests.flatMap(({ system, centre, z, y }) =>
    centre && z ? [{ system, centre, z, y }] : [],
  );
  const first = fans[0];
  if (!first) return [];
  const turned = fans
    .map((fan) => ({
      ...fan,
      turn: turnBetween(
        planeDirection(first.z.at, first.centre),
        planeDirection(fan.z.at, fan.centre),
      ),
    }))
    .sort((a, b) => a.turn - b.turn);
  const outer = [turned[0]!, ...(turned.length > 1 ? [turned.at(-1)!] : [])];
  return outer.flatMap(({ system, centre, z, y }, i): Dimension[] => {
    // Looking from a system to Z, the system with the smallest turn at Z is the one on the right.
    const side = i === 0 ? -1 : 1;
    const reach = (which: 'z' | 'y', to: { at: typeof centre; metres: number }, px: number) => ({
      id: `${which}-distance|${system}`,
      ends: { from: centre, to: to.at },
      text: lengthWords(to.metres, frame.units),
      weight: 'plain' as const,
      asidePx: side * px,
    });
    if (z.metres < frame.metres(150)) return [];
    return [reach('z', z, y ? 60 : 34), ...(y ? [reach('y', y, 30)] : [])];
  });
}

/** The two shortest ways between systems: with three systems they bind all of them. */
function systemDimensions(frame: Frame): Dimension[] {
  const systems = systemsInUse(frame.sheet.layout);
  return systems
    .flatMap((a, i) => systems.slice(i + 1).map((b) => [a, b] as const))
    .flatMap(([a, b]) => {
      const ends = systemsApart(frame, a, b);
      return ends ? [{ a, b, ends }] : [];
    })
    .sort((one, other) => apart(one.ends) - apart(other.ends))
    .slice(0, 2)
    .map(({ a, b, ends }) => ({
      id: `systems-apart|${a},${b}`,
      ends,
      text: lengthWords(apart(ends), frame.units),
      weight: 'plain',
      asidePx: null,
    }));
}
