export type { LeftOut, Restriction, Tally, TallyAxis, TallyCell, TallyRequest } from './tally';
