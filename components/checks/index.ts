export { CheckStepper } from './check-stepper';
export { ChecksPanel } from './checks-panel';
export { countFindings, needsAttention, verdictWords, WORST_FIRST } from './count-findings';
