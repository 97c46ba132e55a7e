import type { LedgerLine, RuleUnit, VerdictOutcome } from '@settlewright/anthropometry';
import { lengthStep, type LengthStyle } from '@settlewright/geometry';
import { knownMargin } from '@/lib/margins.ts';

/** The smallest difference that a number of a check can show. */
function stepOf(unit: RuleUnit, style: LengthStyle): number {
  return unit === 'mm' ? lengthStep({ ...style, feet: false }) : unit === 'deg' ? 0.1 : 1;
}

/**
 * A ledger whose shown figures add up: totals are rounded as they stand, and what rounding the terms
 * loses goes to those that were rounded most. A total that a sum further down needs otherwise is given
 * as `closesTo`.
 */
export function closedLedger(
  lines: readonly LedgerLine[],
  unit: RuleUnit,
  style: LengthStyle,
  closesTo?: Shown,
): readonly LedgerLine[] {
  const step = stepOf(unit, style);
  const inSteps = lines.map(({ value, kind }) =>
    kind === 'total' && closesTo !== undefined && Math.abs(value - closesTo.exact) < step / 100
      ? Math.round(closesTo.shown / step)
      : Math.round(value / step),
  );
  let exact = 0;
  let shown = 0;
  let open: number[] = [];
  for (const [index, line] of lines.entries()) {
    if (line.kind === 'term') {
      exact += line.value;
      shown += inSteps[index] ?? 0;
      open.push(index);
      continue;
    }
    // A total that is no sum of the lines above it stands as it is.
    if (Math.abs(exact - line.value) > step / 2) return lines;
    const missing = (inSteps[index] ?? 0) - shown;
    const lost = (at: number) => (lines[at]?.value ?? 0) / step - (inSteps[at] ?? 0);
    const most = [...open].sort((a, b) => Math.sign(missing) * (lost(b) - lost(a)));
    for (const at of most.slice(0, Math.abs(missing))) inSteps[at] = (inSteps[at] ?? 0) + Math.sign(missing);
    shown = inSteps[index] ?? 0;
    open = [];
  }
  return lines.map((line, index) => ({ ...line, value: (inSteps[index] ?? 0) * step }));
}

/** A number and the figure it is shown as. */
export interface Shown {
  exact: number;
  shown: number;
}

/** How the margin follows from the fail line that decides and the value. */
export interface MarginSum {
  from: Shown;
  take: Shown;
  /** False for a prediction whose margin is rounded to what is known. */
  closes: boolean;
}

/** "17⅜″ − 18⅛″": the fail line nearest to the value decides, from above or from below. */
export function marginSum(
  outcome: Pick<VerdictOutcome, 'value' | 'fail' | 'margin' | 'marginRange'>,
  unit: RuleUnit,
  style: LengthStyle,
): MarginSum | undefined {
  const { value, fail, margin, marginRange } = outcome;
  const step = stepOf(unit, style);
  const sides = [
    ...(fail.upper === undefined ? [] : [{ from: fail.upper, take: value }]),
    ...(fail.lower === undefined ? [] : [{ from: value, take: fail.lower }]),
  ];
  const side = sides.find(({ from, take }) => Math.abs(from - take - margin) < step / 2);
  if (side === undefined) return undefined;
  const rounded = (amount: number) => Math.round(amount / step);
  let [from, take] = [rounded(side.from), rounded(side.take)];
  const isFine = knownMargin(margin, marginRange ?? null, unit, style).margin === margin;
  // Each of three figures is rounded by itself; the one that was rounded most gives way by one step.
  const missing = rounded(margin) - (from - take);
  if (isFine && Math.abs(missing) === 1) {
    const lostFrom = (side.from / step - from) * missing;
    const lostTake = (take - side.take / step) * missing;
    if (lostFrom > lostTake) from += missing;
    else take -= missing;
  }
  return {
    from: { exact: side.from, shown: from * step },
    take: { exact: side.take, shown: take * step },
    closes: isFine && from - take === rounded(margin),
  };
}
