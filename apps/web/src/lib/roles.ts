import type { Role } from './contract.ts';

/** The roles in the order of what they may do, each with what it is for. */
export const ROLES: readonly { value: Role; words: string; describe: string }[] = [
  { value: 'owner', words: 'Owner', describe: 'Everything, and the members' },
  { value: 'designer', words: 'Designer', describe: 'Productions, cast, sets, revisions and orders' },
  { value: 'carpenter', words: 'Carpenter', describe: 'Reads, ticks off what is built, leaves marks' },
  { value: 'reviewer', words: 'Reviewer', describe: 'Reads, comments, approves a revision' },
];
