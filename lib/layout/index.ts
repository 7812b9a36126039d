export { KIND_WORDS } from './kind-words';
export * from './pieces';
export * from './plan';
export * from './queries';
export * from './reach';
export * from './schema';
export { openLayout, UPGRADES } from './upgrade';
export { SYSTEMS, type System } from './values';
