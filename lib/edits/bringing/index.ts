export { bondFor, hoseFor } from './between-units';
export { bring } from './bring';
export { groundCableFor } from './ground-cable-for';
export { jumperFor } from './jumper-for';
export { runBetween } from './run-between';
export { joinedRods, systemFor } from './system-piece';
export { systemToServe } from './system-to-serve';
export { leadsFrom, testLine, truePoint } from './test-line';
export type { Means, Wanted } from './wanted';
