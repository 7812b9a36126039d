export { CHECKS } from './all';
export { CLASS_WORDS } from './buried-lines-known';
export { neededFt } from './cables-reach';
export { clockWords, firstToFail, type FirstToFail } from './first-to-fail';
export { checkReport, countByStatus, hasOpenItems, type CheckReport } from './report';
export { runChecks } from './run';
export { standsFor, within, type WindArc } from './stands-for';
export { doubtFt } from './support/ground-lines';
export * from './types';
