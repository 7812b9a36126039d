export * from './pieces';
export * from './queries';
export * from './schema';
export { SYSTEMS, type System } from './values';
