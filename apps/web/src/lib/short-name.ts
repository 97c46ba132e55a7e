/** "The stand-in", "removed sitter 2": words for somebody, not a first name and another. */
const NOT_A_FIRST_NAME = /^(the|removed) /i;

const CHILD = /^Child, size mark (\d)$/;

/** First name for lines where room is short; a mannequin keeps "Woman, 5th", a child "Child, size 4". */
export function shortName(name: string): string {
  const [mannequin] = /^(Woman|Man), \d+\w\w/.exec(name) ?? [];
  if (mannequin !== undefined) return mannequin;
  const [, sizeMark] = CHILD.exec(name) ?? [];
  if (sizeMark !== undefined) return `Child, size ${sizeMark}`;
  return NOT_A_FIRST_NAME.test(name) ? name : (name.split(' ')[0] ?? name);
}

/** "HV" for Hetty Vance, "W5" for the woman at the 5th, "C4" for the child of size mark 4. */
export const initials = (name: string): string =>
  name
    .replace(CHILD, 'Child $1')
    .split(/\s+/)
    .map((part) => part[0] ?? '')
    .slice(0, 2)
    .join('')
    .toUpperCase();
