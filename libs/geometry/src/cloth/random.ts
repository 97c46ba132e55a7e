/**
 * Numbers in [0, 1) that are the same for the same seed.
 *
 * @param seed - any whole number
 * @returns a function that gives the next number
 * @source Marsaglia, Xorshift RNGs, 2003 (shifts 13, 17, 5)
 */
export function seededRandom(seed: number): () => number {
  let state = seed | 0 || 0x9e3779b9;
  return () => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return (state >>> 0) / 2 ** 32;
  };
}
