export * from './measures/measures.ts';
export * from './people/person.ts';
export * from './checks/situation.ts';
export * from './checks/fit-sheet.ts';
