import type { Scene } from '../scene';
import { dunmarrowSiding } from './dunmarrow-siding';
import { harrowFlatCoop } from './harrow-flat-coop';
import { sorrelCreekRamp } from './sorrel-creek-ramp';

/** The places of the demonstration. All invented; nothing stands there. */
export const SCENES: readonly Scene[] = [sorrelCreekRamp, dunmarrowSiding, harrowFlatCoop];
export { dunmarrowSiding, harrowFlatCoop, sorrelCreekRamp };
