export { databaseAway, isCollision, isDatabaseAway } from './from-error';
export { notFound, Refusal, refuseFaults, STATUSES } from './problem';
export { problemResponse } from './respond';
