/** Takes a document of one layout number to the next. */
type Upgrade = (document: Record<string, unknown>) => Record<string, unknown>;

/** `UPGRADES[n]` takes layout n to n + 1; the first layout is 1. */
const UPGRADES: Readonly<Record<number, Upgrade>> = {};

/**
 * Brings a document of an older layout to a newer one, step by step.
 *
 * @param document - plain JSON with a `schemaVersion`
 * @param from - its layout number
 * @param to - the layout number to reach
 * @returns the upgraded document, or undefined when a step is missing
 */
export function upgraded(
  document: Record<string, unknown>,
  from: number,
  to: number,
): Record<string, unknown> | undefined {
  let current = document;
  for (let version = from; version < to; version += 1) {
    const step = UPGRADES[version];
    if (step === undefined) return undefined;
    current = { ...step(current), schemaVersion: version + 1 };
  }
  return current;
}
