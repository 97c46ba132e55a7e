const SUFFIX = ' (copy)';
const LONGEST = 120;

/** Name of a copy, within the length that a name may have. */
export function copyName(name: string): string {
  return name.slice(0, LONGEST - SUFFIX.length) + SUFFIX;
}
