export { CHECKS } from './all';
export { firstToFail, type FirstToFail } from './first-to-fail';
export { runChecks } from './run';
export { standsFor, type WindArc } from './stands-for';
export * from './types';
