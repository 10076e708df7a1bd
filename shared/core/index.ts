export { assertNever } from './assert-never';
export type { Issue } from './issue';
export { failure, success } from './result';
export type { Result } from './result';
