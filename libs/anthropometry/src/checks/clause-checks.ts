import { accessibleOnly } from './clause.ts';
import type { PieceAsked, PieceCheck } from './piece-check.ts';
import { MM_PER_INCH, ruleNumber, type Rule } from './rule-book.ts';
import type { BenchSituation, TableSituation } from './situation.ts';

const benches = (asked: PieceAsked): BenchSituation[] => asked.situation.benches;
const tables = (asked: PieceAsked): TableSituation[] => asked.situation.tables;

/**
 * Height of an accessible bench: the unpressed seat top.
 *
 * @source rule ACC-01
 */
export const accessibleBenchHeight: PieceCheck = {
  id: 'ACC-01',
  ask: accessibleOnly('bench', benches, (bench, rule, part) => [
    part('seat top, not pressed', bench.unpressedSeatTopMm, {
      lower: ruleNumber(rule, 'lower'),
      upper: ruleNumber(rule, 'upper'),
    }),
  ]),
};

/**
 * Length and depth of an accessible bench.
 *
 * @source rule ACC-02
 */
export const accessibleBenchSize: PieceCheck = {
  id: 'ACC-02',
  ask: accessibleOnly('bench', benches, (bench, rule, part) => [
    part('length', bench.lengthMm, { lower: ruleNumber(rule, 'length') }),
    part('depth', bench.effectiveDepthMm, {
      lower: ruleNumber(rule, 'depthLower'),
      upper: ruleNumber(rule, 'depthUpper'),
    }),
  ]),
};

/**
 * Back of an accessible bench. Fixed to a wall, only the length of wall behind the seat is asked.
 *
 * @source rule ACC-03
 */
export const accessibleBenchBack: PieceCheck = {
  id: 'ACC-03',
  ask: accessibleOnly('bench', benches, (bench, rule, part) => {
    const { back } = bench;
    const length = { lower: ruleNumber(rule, 'length') };
    if (!back) return [part('length of the back', 0, length)];
    if (back.fixedToWall) return [part('length of the wall behind the seat', back.lengthMm, length)];
    return [
      part('bottom of the back over the seat', back.bottomAboveSeatMm, { upper: ruleNumber(rule, 'bottom') }),
      part('top of the back over the seat', back.topAboveSeatMm, { lower: ruleNumber(rule, 'top') }),
      part('gap from the seat to the back', back.gapToSeatMm, { upper: ruleNumber(rule, 'gap') }),
      part('length of the back', back.lengthMm, length),
    ];
  }),
};

/**
 * Clear floor beside the end of an accessible bench.
 *
 * @source rule ACC-04
 */
export const accessibleBenchEnd: PieceCheck = {
  id: 'ACC-04',
  ask: accessibleOnly('bench', benches, ({ endSpace }, rule, part) => [
    part('clear floor away from the end', endSpace?.widthMm ?? 0, { lower: ruleNumber(rule, 'width') }),
    part('clear floor along the end', endSpace?.lengthMm ?? 0, { lower: ruleNumber(rule, 'length') }),
  ]),
};

/**
 * Height of an accessible dining surface.
 *
 * @source rule ACC-05
 */
export const accessibleTableHeight: PieceCheck = {
  id: 'ACC-05',
  ask: accessibleOnly('table', tables, (table, rule, part) => [
    part('table top', table.topMm, { lower: ruleNumber(rule, 'lower'), upper: ruleNumber(rule, 'upper') }),
  ]),
};

/**
 * Knee depth that a clause asks for at a height.
 *
 * @param rule - ACC-06
 * @param heightMm - above the floor; held to the range of the clause
 * @returns millimetres
 * @source rule ACC-06: 11 in at 9 in high, 1 in less for every 6 in
 */
export function kneeDepthNeededMm(rule: Rule, heightMm: number): number {
  const from = ruleNumber(rule, 'kneeFrom');
  const held = Math.min(Math.max(heightMm, from), ruleNumber(rule, 'kneeTo'));
  return ruleNumber(rule, 'kneeDepthAtFrom') - (held - from) * (MM_PER_INCH / ruleNumber(rule, 'kneeRise'));
}

/**
 * Knee and toe space below an accessible table. Depth beyond the clause's most is not counted, nor is toe space
 * further than its allowance beyond the knee space.
 *
 * @source rule ACC-06
 */
export const accessibleKneeSpace: PieceCheck = {
  id: 'ACC-06',
  ask: accessibleOnly('table', tables, (table, rule, part) => {
    const { clearHeightMm, widthMm, depthAt, toeDepthMm } = table.kneeSpace;
    const from = ruleNumber(rule, 'kneeFrom');
    const to = ruleNumber(rule, 'kneeTo');
    const knee = depthAt
      .filter(({ heightMm }) => heightMm >= from - TOUCHING && heightMm <= to + TOUCHING)
      .map(({ heightMm, depthMm }) => ({ depthMm, needMm: kneeDepthNeededMm(rule, heightMm) }));
    const tightest = knee.reduce<(typeof knee)[number] | undefined>(
      (a, b) => (a && a.depthMm - a.needMm <= b.depthMm - b.needMm ? a : b),
      undefined,
    );
    const atFrom = depthAt.find(({ heightMm }) => Math.abs(heightMm - from) <= TOUCHING)?.depthMm ?? 0;
    const toe = Math.min(
      toeDepthMm,
      atFrom + ruleNumber(rule, 'toeBeyondKnee'),
      ruleNumber(rule, 'toeUpper'),
    );
    return [
      part('clear height', clearHeightMm, { lower: ruleNumber(rule, 'clearHeight') }),
      part('width', widthMm, { lower: ruleNumber(rule, 'width') }),
      part('knee depth where it is least', tightest?.depthMm ?? 0, {
        lower: tightest?.needMm ?? ruleNumber(rule, 'kneeDepthAtFrom'),
      }),
      part('toe depth that counts', toe, { lower: ruleNumber(rule, 'toeLower') }),
    ];
  }),
};

/** Heights this close are the same height, millimetres. */
const TOUCHING = 0.5;
