/** Fewer than this in a row are said one by one. */
const LEAST_RUN = 3;
/** More parts than this are said as the first, the last and how many. */
const MOST_PARTS = 6;

/**
 * Marks in a row, as on a drawing: "C1 to C4, C6".
 *
 * @param marks - letters and a number each, in the order of their numbers
 * @returns nothing for none; of many that are no row the first, the last and how many
 */
export function marksWords(marks: readonly string[]): string {
  const runs: string[][] = [];
  for (const mark of marks) {
    const run = runs.at(-1);
    if (run && follows(run.at(-1)!, mark)) run.push(mark);
    else runs.push([mark]);
  }
  const parts = runs.flatMap((run) => (run.length < LEAST_RUN ? run : [`${run[0]} to ${run.at(-1)}`]));
  if (parts.length <= MOST_PARTS) return parts.join(', ');
  return `${marks[0]} to ${marks.at(-1)}, ${marks.length} in all`;
}

function follows(before: string, after: string): boolean {
  const [a, b] = [before, after].map((mark) => /^(\D*)(\d+)$/.exec(mark));
  return !!a && !!b && a[1] === b[1] && Number(b[2]) === Number(a[2]) + 1;
}
