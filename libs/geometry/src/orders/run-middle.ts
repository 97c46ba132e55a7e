import type { CushionSpec } from '../cushions/cushion-spec.ts';

/**
 * From the middle of a cushion to the middle of its run, to the right on its plan (the sitter's left).
 *
 * @param spec - the cushion
 * @param cushions - with the others of its run
 * @returns millimetres
 */
export function fromRunMiddleMm(spec: CushionSpec, cushions: readonly CushionSpec[]): number {
  const run = cushions.filter(({ benchId, kind }) => benchId === spec.benchId && kind === spec.kind);
  const start = ({ datum }: CushionSpec) => datum.toSeamMm;
  const end = (one: CushionSpec) => one.datum.toSeamMm + one.finishedMm.widthMm;
  const middle = (Math.min(...run.map(start)) + Math.max(...run.map(end))) / 2;
  const own = (start(spec) + end(spec)) / 2;
  // Measured from the sitter's left, what is further from the datum is further to the left on the page.
  return spec.datum.side === 'left' ? own - middle : middle - own;
}
