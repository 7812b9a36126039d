export * from './changes';
export * from './hooks';
export * from './paths';
export * from './problem';
export { request } from './request';
