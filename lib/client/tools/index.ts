export { guideOf, type Guide } from './guide';
export { planTool, withAnotherInHand } from './plan-tool';
export { NEAR_PX } from './threshold';
export { IDLE, type KeyEvent, type PointerEvent, type Scene, type Step } from './types';
export type { ToolEvent, ToolState, Under } from './types';
