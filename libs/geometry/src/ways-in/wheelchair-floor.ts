import { kneeDepthNeededMm, ruleNumber, type RuleBook } from '@settlewright/anthropometry';
import { benchLayout } from '../pieces/bench-layout.ts';
import type { PieceOf, SetDocument } from '../room/document.ts';
import { distanceToOrigin } from '../situation/clear-floor.ts';
import { clipped, rectangleIn, type PlanFrame, type PlanOutline } from '../situation/plan.ts';
import { planOfPiece, solidsNear, survey, type Survey } from '../situation/survey.ts';
import { edgeAt } from '../situation/tables.ts';

/** What a wheelchair user needs of a floor. */
export type FloorKind = 'floor' | 'approach' | 'knee-space' | 'toe-space' | 'turning-circle' | 'turning-tee';

/** One such space, for a drawing and for the words beside it. */
export interface FloorShape {
  kind: FloorKind;
  /** The piece it belongs to; absent for turning round. */
  pieceId?: string;
  mark?: string;
  outline: PlanOutline;
  widthMm: number;
  lengthMm: number;
  /** Heights that have to be clear; knee space is less deep higher up, as its clause has it. */
  heightsMm: readonly [number, number];
  ruleId: string;
  clause: string;
  /** Marks of what stands in it. */
  blockedBy: string[];
}

const CIRCLE_SIDES = 48;
const QUARTERS_RAD = [0, 1, 2, 3].map((n) => (n * Math.PI) / 2);

type Window = { left: readonly [number, number]; ahead: readonly [number, number] };

/**
 * Clear floor, approach, knee and toe space of every accessible table, floor at the end of every accessible bench, and
 * space for turning round where the set keeps one. Of edges and ends the one with least in its way is taken.
 *
 * @param document - the set
 * @param ruleBook - sizes and clauses
 * @returns shapes in the room's x and z, millimetres
 * @source rules ACC-04, ACC-06, ACC-08, EGRESS-03 and HEAD-03
 */
export function wheelchairFloor(document: SetDocument, ruleBook: Pick<RuleBook, 'rule'>): FloorShape[] {
  const found = survey(document);
  const maker = shapeMaker(found, ruleBook);
  const pieces = document.pieces.flatMap((piece) => {
    if (!piece.accessible) return [];
    if (piece.kind === 'table')
      return leastBlocked(QUARTERS_RAD.map((turn) => atTable(maker, piece, edgeAt(piece, turn).plan)));
    return piece.kind === 'bench' ? leastBlocked([1, -1].map((side) => [atBench(maker, piece, side)])) : [];
  });
  return [...pieces, ...turning(maker, found)];
}

type Maker = ReturnType<typeof shapeMaker>;

function shapeMaker(found: Survey, ruleBook: Pick<RuleBook, 'rule'>) {
  const number = (id: string, name: string) => ruleNumber(ruleBook.rule(id), name);
  const overHeadsMm = number('HEAD-03', 'pass');
  const marks = new Map(found.document.pieces.map(({ id, mark }) => [id, mark]));
  const named = (ids: readonly string[]) => [...new Set(ids)].map((id) => marks.get(id) ?? id);
  const clauseOf = (ruleId: string) => ruleBook.rule(ruleId).clause ?? '';
  return {
    number,
    clauseOf,
    named,
    overHeadsMm,
    /** How deep knees reach under what begins at a height: less the higher it is. */
    kneesUnder: (bottomMm: number) => kneeDepthNeededMm(ruleBook.rule('ACC-06'), bottomMm),
    /** A rectangle in a frame, with what stands in it at its heights; `farUnder` where it is less deep under some things. */
    rectangle: (
      kind: FloorKind,
      ruleId: string,
      plan: PlanFrame,
      window: Window,
      heightsMm: readonly [number, number] = [0, overHeadsMm],
      farUnder: (bottomMm: number) => number = () => window.ahead[1],
    ): FloorShape => {
      const { left, ahead } = window;
      const inside = solidsNear(
        found,
        plan,
        Infinity,
        () => true,
        ({ bottomMm, topMm }) => bottomMm < heightsMm[1] && topMm > heightsMm[0],
      ).filter(
        ({ outline, bottomMm }) =>
          clipped(outline, { left, ahead: [ahead[0], farUnder(bottomMm)] }).length > 0,
      );
      return {
        kind,
        outline: rectangleIn(plan, left, ahead),
        widthMm: left[1] - left[0],
        lengthMm: ahead[1] - ahead[0],
        heightsMm,
        ruleId,
        clause: clauseOf(ruleId),
        blockedBy: named(inside.map(({ pieceId }) => pieceId)),
      };
    },
  };
}

const blocked = (shapes: readonly FloorShape[]): number =>
  shapes.reduce((sum, { blockedBy }) => sum + blockedBy.length, 0);

const leastBlocked = (choices: readonly FloorShape[][]): FloorShape[] =>
  choices.reduce((best, one) => (blocked(one) < blocked(best) ? one : best), choices[0] ?? []);

function atTable(
  { number, rectangle, kneesUnder }: Maker,
  table: PieceOf<'table'>,
  edge: PlanFrame,
): FloorShape[] {
  const [width, length] = [number('ACC-04', 'width'), number('ACC-04', 'length')];
  const [kneeFrom, kneeTo] = [number('ACC-06', 'kneeFrom'), number('ACC-06', 'kneeTo')];
  const [knee, toe] = [number('ACC-06', 'kneeDepthAtFrom'), number('ACC-06', 'toeLower')];
  const route = number('EGRESS-03', 'width');
  const left = [-width / 2, width / 2] as const;
  // The floor reaches in under the top as far as the toes have to.
  const rear = toe - length;
  const of = { pieceId: table.id, mark: table.mark };
  return [
    { ...rectangle('floor', 'ACC-04', edge, { left, ahead: [rear, 0] }), lengthMm: length, ...of },
    {
      ...rectangle('approach', 'EGRESS-03', edge, {
        left: [-route / 2, route / 2],
        ahead: [rear - length, rear],
      }),
      ...of,
    },
    {
      ...rectangle('knee-space', 'ACC-06', edge, { left, ahead: [0, knee] }, [kneeFrom, kneeTo], kneesUnder),
      ...of,
    },
    { ...rectangle('toe-space', 'ACC-06', edge, { left, ahead: [0, toe] }, [0, kneeFrom]), ...of },
  ];
}

function atBench({ number, rectangle }: Maker, bench: PieceOf<'bench'>, side: number): FloorShape {
  const [width, length] = [number('ACC-04', 'width'), number('ACC-04', 'length')];
  const end = bench.lengthMm / 2;
  const left = side > 0 ? ([end, end + width] as const) : ([-end - width, -end] as const);
  const from = Math.min(0, benchLayout(bench).frontZMm - length);
  const spots = [0, from].map((rear) =>
    rectangle('floor', 'ACC-04', planOfPiece(bench), { left, ahead: [rear, rear + length] }),
  );
  const [spot] = leastBlocked(spots.map((one) => [one]));
  return { ...(spot as FloorShape), pieceId: bench.id, mark: bench.mark };
}

function turning({ number, rectangle, clauseOf, named, overHeadsMm }: Maker, found: Survey): FloorShape[] {
  const { turningAt } = found.document.asked;
  if (turningAt === undefined) return [];
  const { xMm, zMm } = turningAt;
  const widthMm = number('ACC-08', 'circle');
  const inside = solidsNear(
    found,
    { ...turningAt, facingRad: 0 },
    widthMm / 2,
    () => true,
    ({ bottomMm }) => bottomMm < overHeadsMm,
  ).filter(({ outline }) => distanceToOrigin(outline) < widthMm / 2);
  const circle: FloorShape = {
    kind: 'turning-circle',
    outline: Array.from({ length: CIRCLE_SIDES }, (_, n) => {
      const angle = (2 * Math.PI * n) / CIRCLE_SIDES;
      return [xMm + (widthMm / 2) * Math.cos(angle), zMm + (widthMm / 2) * Math.sin(angle)] as const;
    }),
    widthMm,
    lengthMm: widthMm,
    heightsMm: [0, overHeadsMm],
    ruleId: 'ACC-08',
    clause: clauseOf('ACC-08'),
    blockedBy: named(inside.map(({ pieceId }) => pieceId)),
  };
  const [arm, square] = [number('ACC-08', 'arm'), number('ACC-08', 'square')];
  const tees = QUARTERS_RAD.map((facingRad) => {
    const plan = { ...turningAt, facingRad };
    const half = square / 2;
    return [
      rectangle('turning-tee', 'ACC-08', plan, { left: [-half, half], ahead: [-half, arm - half] }),
      rectangle('turning-tee', 'ACC-08', plan, { left: [-arm / 2, arm / 2], ahead: [arm - half, half] }),
    ];
  });
  return [circle, ...leastBlocked(tees)];
}
