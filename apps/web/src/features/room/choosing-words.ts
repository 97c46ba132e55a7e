/** "B1, B2 and T1". */
export function joinWords(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}

/** What a change of the chosen pieces is told as: "B1, B2 and T1 chosen. B1 stays when they line up". */
export function sayChosen(marks: readonly string[]): string {
  if (marks.length === 0) return 'Nothing chosen';
  const chosen = `${joinWords(marks)} chosen`;
  return marks.length === 1 ? chosen : `${chosen}. ${marks[0]} stays when they line up`;
}
