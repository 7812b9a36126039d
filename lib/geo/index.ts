export * from './angles';
export * from './footprint';
export * from './formats';
export * from './local-plane';
export * from './planar';
export * from './position';
export * from './segment-index';
export * from './units';
