export { ConditionsPanel } from './conditions-panel';
export { WindChip } from './wind-chip';
