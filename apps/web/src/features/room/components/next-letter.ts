/** Letter of the next revision: A to Z, then AA. */
export function nextLetter(last: string | undefined): string {
  if (!last) return 'A';
  const rest = last.slice(0, -1);
  return last.endsWith('Z')
    ? `${nextLetter(rest || undefined)}A`
    : rest + String.fromCharCode(last.charCodeAt(last.length - 1) + 1);
}
