const ALPHABET = 26;

/** Letter of the n-th revision, counted from 1: A … Z, AA, AB … as columns of a ledger. */
export function revisionLetter(ordinal: number): string {
  let rest = ordinal;
  let letters = '';
  while (rest > 0) {
    letters = String.fromCharCode(65 + ((rest - 1) % ALPHABET)) + letters;
    rest = Math.floor((rest - 1) / ALPHABET);
  }
  return letters;
}
