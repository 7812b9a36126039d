import { acceptanceSet } from './acceptance-set';
import { buriedLinesKnown } from './buried-lines-known';
import { cablesReach } from './cables-reach';
import { cablesSeparate } from './cables-separate';
import { clearOfBuriedLines } from './clear-of-buried-lines';
import { clearOfOverhead } from './clear-of-overhead';
import { drivableGround } from './drivable-ground';
import { ignitionClear } from './ignition-clear';
import { kitCovers } from './kit-covers';
import { leadsClear } from './leads-clear';
import { liquidKnown } from './liquid-known';
import { locatesCurrent } from './locates-current';
import { lowGround } from './low-ground';
import { outsideHotZone } from './outside-hot-zone';
import { piecesClear } from './pieces-clear';
import { rodsApart } from './rods-apart';
import { rodsJoined } from './rods-joined';
import { sourcesKnown } from './sources-known';
import { systemComplete } from './system-complete';
import { systemsApart } from './systems-apart';
import { testComplete } from './test-complete';
import { testLineClearOfMetal } from './test-line-clear-of-metal';
import type { Check } from './types';
import { unitsBonded } from './units-bonded';
import { unitsGrounded } from './units-grounded';
import { uphill } from './uphill';
import { upwind } from './upwind';
import { ventClear } from './vent-clear';
import { windAndSlopeAgree } from './wind-and-slope-agree';
import { windFresh } from './wind-fresh';
import { yDistance } from './y-distance';
import { yInLine } from './y-in-line';
import { yRatioCheck } from './y-ratio';
import { zCentral } from './z-central';
import { zDistance } from './z-distance';
import { zFarEnough } from './z-far-enough';

/** Every check, in the order of the questions they answer. */
export const CHECKS: readonly Check[] = [
  sourcesKnown,
  systemComplete,
  rodsJoined,
  unitsGrounded,
  unitsBonded,
  cablesSeparate,
  piecesClear,
  acceptanceSet,
  liquidKnown,
  systemsApart,
  rodsApart,
  outsideHotZone,
  upwind,
  uphill,
  windAndSlopeAgree,
  windFresh,
  ignitionClear,
  ventClear,
  drivableGround,
  lowGround,
  testComplete,
  zDistance,
  zCentral,
  yDistance,
  yInLine,
  yRatioCheck,
  zFarEnough,
  testLineClearOfMetal,
  leadsClear,
  buriedLinesKnown,
  clearOfBuriedLines,
  locatesCurrent,
  clearOfOverhead,
  cablesReach,
  kitCovers,
];
