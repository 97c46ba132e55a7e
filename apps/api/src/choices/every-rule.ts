/** Stands for every rule of a person that a number moves. */
export const EVERY_RULE = 'all';
