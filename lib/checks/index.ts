export { CHECKS } from './all';
export { CLASS_WORDS } from './buried-lines-known';
export { neededFt } from './cables-reach';
export { doubtFt } from './clear-of-buried-lines';
export { clockWords, firstToFail, within, type FirstToFail } from './first-to-fail';
export { checkReport, countByStatus, hasOpenItems, type CheckReport } from './report';
export { runChecks } from './run';
export { standsFor, type WindArc } from './stands-for';
export * from './types';
