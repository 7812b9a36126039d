export * from './base-map';
export * from './checks';
export {
  LABEL_MOST,
  layoutParams,
  MOST_BYTES,
  siteParams,
  versionParams,
  type Who,
} from './common';
export * from './health';
export * from './kits';
export * from './layouts';
export * from './limits';
export * from './problem';
export * from './sign-in';
export * from './sites';
