import type { CushionGroup, CushionSpec } from './cushion-spec.ts';

const tenth = (mm: number): number => Math.round(mm * 10) / 10;

/** All that makes two cushions the same piece of work, columns counted from the sitter's left. */
function likeness(spec: CushionSpec, mirrored: boolean): string {
  const { widthMm, depthMm, thicknessMm } = spec.finishedMm;
  const fromLeft = spec.buttons.columns.map(({ fromSeamMm }) =>
    spec.datum.side === 'left' ? fromSeamMm : widthMm - fromSeamMm,
  );
  const columns = fromLeft.map((x) => tenth(mirrored ? widthMm - x : x)).sort((a, b) => a - b);
  const { grade, densityKgM3, ifd25N, supportFactor } = spec.foam;
  return JSON.stringify([
    spec.kind,
    [widthMm, depthMm, thicknessMm].map(tenth),
    columns,
    spec.buttons.rowsMm.map(tenth),
    [grade, densityKgM3, ifd25N, supportFactor],
    mirroredHand(spec.hand, mirrored),
  ]);
}

function mirroredHand(hand: CushionSpec['hand'], mirrored: boolean): CushionSpec['hand'] {
  if (!mirrored || hand === 'either') return hand;
  return hand === 'left' ? 'right' : 'left';
}

/**
 * Puts cushions that are made alike together and names those that are their mirror image.
 *
 * @param specs - from `deriveCushions`
 * @returns groups in the order of their first mark
 */
export function groupCushions(specs: readonly CushionSpec[]): CushionGroup[] {
  const groups = new Map<string, CushionGroup>();
  for (const spec of specs) {
    const key = likeness(spec, false);
    const group = groups.get(key);
    if (group) group.marks.push(spec.mark);
    else groups.set(key, { marks: [spec.mark], spec, hand: spec.hand, mirroredMarks: [] });
  }
  for (const [key, group] of groups) {
    const mirrorKey = likeness(group.spec, true);
    if (mirrorKey !== key) group.mirroredMarks = groups.get(mirrorKey)?.marks.slice() ?? [];
  }
  return [...groups.values()];
}
