export * from './base-map';
export * from './checks';
export { LABEL_MOST, MOST_BYTES, type Who } from './common';
export * from './health';
export * from './kits';
export * from './layouts';
export * from './limits';
export * from './problem';
export * from './sites';
