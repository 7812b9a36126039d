import type { CheckInput } from '@/lib/checks';
import * as apart from './apart';
import * as complete from './complete';
import * as kit from './kit';
import * as place from './place';
import { Scene, type TwinFinding } from './scene';
import * as testLine from './test-line';
import * as underOver from './under-over';

export { compareFindings, compareArcs } from './compare';
export { twinStandsFor } from './stands-for';
export { type TwinFinding } from './scene';

const RULES: readonly ((scene: Scene) => TwinFinding[])[] = [
  complete.sourcesKnown,
  complete.systemComplete,
  complete.rodsJoined,
  complete.unitsGrounded,
  complete.unitsBonded,
  complete.cablesSeparate,
  complete.piecesClear,
  complete.acceptanceSet,
  complete.liquidKnown,
  apart.systemsApart,
  apart.rodsApart,
  place.outsideHotZone,
  place.upwind,
  place.uphill,
  place.windAndSlopeAgree,
  place.windFresh,
  place.ignitionClear,
  place.ventClear,
  place.drivableGround,
  place.lowGround,
  testLine.testComplete,
  testLine.zDistance,
  testLine.zCentral,
  testLine.yDistance,
  testLine.yInLine,
  testLine.yRatio,
  testLine.zFarEnough,
  testLine.testLineClearOfMetal,
  testLine.leadsClear,
  underOver.buriedLinesKnown,
  underOver.clearOfBuriedLines,
  underOver.locatesCurrent,
  underOver.clearOfOverhead,
  kit.cablesReach,
  kit.kitCovers,
];

/** Every rule answered the slow, obvious way, written from the rules' own text. */
export function twinFindings({ layout, site, limits, asOf }: CheckInput): TwinFinding[] {
  const scene = new Scene(layout, site, limits, asOf);
  return RULES.flatMap((rule) => rule(scene));
}
