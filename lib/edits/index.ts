export { applyEdit } from './apply-edit';
export * from './history';
export { anchorOf } from './move';
export * from './types';
