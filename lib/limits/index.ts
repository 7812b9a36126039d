export * from './fixed-numbers';
export * from './limit-table';
export * from './limits';
export * from './marks';
