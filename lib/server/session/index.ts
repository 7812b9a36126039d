export { currentPerson } from './current-person';
export { findSession } from './find-session';
export { personOf } from './of-request';
export type { SignedIn } from './signed-in';
