import { nothing, plainQuestion, type PieceAnswer, type PieceAsked, type PieceCheck } from './piece-check.ts';
import { fixedSide, type Side } from './question.ts';
import { ruleNumber, type Rule } from './rule-book.ts';
import type { TableSituation } from './situation.ts';

const passAndFail = (rule: Rule): Side => fixedSide(ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail'));

/** Asks every table. */
const eachTable =
  (ask: (table: TableSituation, asked: PieceAsked) => PieceAnswer['said']) =>
  (asked: PieceAsked): PieceAnswer[] => {
    const { tables } = asked.situation;
    if (tables.length === 0) return nothing('no table');
    return tables.map((table) => ({
      pieceIds: [table.pieceId],
      marks: [table.mark],
      said: ask(table, asked),
    }));
  };

/** Asks a table by the edge that gives each diner least. */
const perDiner = (label: string, measure: 'lengthMm' | 'clearBetweenLegsMm') =>
  eachTable((table, { rule }) => {
    const edges = table.edges.filter(({ placeIds }) => placeIds.length > 0);
    if (edges.length === 0) return { kind: 'doesNotApply', reason: 'nobody sits at the table' };
    const least = Math.min(...edges.map((edge) => edge[measure] / edge.placeIds.length));
    return plainQuestion(label, least, { lower: passAndFail(rule) });
  });

/**
 * Table edge for each diner.
 *
 * @source rule TABLE-08
 */
export const tableEdge: PieceCheck = { id: 'TABLE-08', ask: perDiner('edge for each diner', 'lengthMm') };

/**
 * Clear width between the legs for each diner.
 *
 * @source rule TABLE-10
 */
export const betweenLegs: PieceCheck = {
  id: 'TABLE-10',
  ask: perDiner('between the legs, for each diner', 'clearBetweenLegsMm'),
};

/**
 * Width of the table between diners that face each other.
 *
 * @source rule TABLE-09
 */
export const tableAcross: PieceCheck = {
  id: 'TABLE-09',
  ask: eachTable((table, { rule }) =>
    table.betweenFacingMm === undefined
      ? { kind: 'doesNotApply', reason: 'nobody sits opposite' }
      : plainQuestion('across the table', table.betweenFacingMm, { lower: passAndFail(rule) }),
  ),
};

/**
 * How far the table edge lies over the seat front, for each bench at a table.
 *
 * @source rule TABLE-07
 */
export const tableOverSeat: PieceCheck = {
  id: 'TABLE-07',
  ask({ rule, situation }) {
    const found = new Map<string, PieceAnswer>();
    for (const { pieceId, mark, table } of situation.places) {
      if (!table) continue;
      const key = `${table.pieceId}|${pieceId}`;
      if (found.has(key)) continue;
      found.set(key, {
        pieceIds: [table.pieceId, pieceId],
        marks: [table.mark, mark],
        said: plainQuestion('table edge over the seat front', table.overlapMm, {
          lower: fixedSide(ruleNumber(rule, 'passLower'), ruleNumber(rule, 'failLower')),
          upper: fixedSide(ruleNumber(rule, 'passUpper'), ruleNumber(rule, 'failUpper')),
        }),
      });
    }
    return found.size > 0 ? [...found.values()] : nothing('no table');
  },
};

/**
 * Usable depth of each sill that somebody sits at.
 *
 * @source rule SILL-03
 */
export const sillDepth: PieceCheck = {
  id: 'SILL-03',
  ask({ rule, situation }) {
    const found = new Map<string, PieceAnswer>();
    for (const { sills } of situation.places) {
      for (const { pieceId, mark, side, usableDepthMm } of sills) {
        if (side === 'behind' || found.has(pieceId)) continue;
        found.set(pieceId, {
          pieceIds: [pieceId],
          marks: [mark],
          said: plainQuestion('depth to lean on', usableDepthMm, { lower: passAndFail(rule) }),
        });
      }
    }
    return found.size > 0 ? [...found.values()] : nothing('no sill beside a place');
  },
};

/**
 * Gap between two tables on the way to a bench.
 *
 * @source rule EGRESS-01
 */
export const betweenTables: PieceCheck = {
  id: 'EGRESS-01',
  ask: (asked) => ways(asked, 'between-tables', 'between the tables', passAndFail(asked.rule)),
};

/** Kinds of traffic, each asking for more than the one before. */
const TRAFFIC = ['none', 'edge-past', 'walk-past', 'wheelchair'] as const;
const NUMBER_OF: Record<(typeof TRAFFIC)[number], string> = {
  none: 'none',
  'edge-past': 'edgePast',
  'walk-past': 'walkPast',
  wheelchair: 'wheelchair',
};

/**
 * Room behind a loose seat at a table, for the traffic that was asked.
 *
 * @source rule EGRESS-02; the fail line is the pass line of the kind of traffic below
 */
export const behindSeat: PieceCheck = {
  id: 'EGRESS-02',
  ask(asked) {
    const { rule, settings } = asked;
    const level = TRAFFIC.indexOf(settings.trafficBehind);
    const limit = (index: number) => ruleNumber(rule, NUMBER_OF[TRAFFIC[Math.max(0, index)] ?? 'none']);
    return ways(
      asked,
      'behind-seat',
      'table edge to the obstruction behind',
      fixedSide(limit(level), limit(level - 1)),
    );
  },
};

function ways(
  { situation }: PieceAsked,
  kind: 'between-tables' | 'behind-seat',
  label: string,
  lower: Side,
): PieceAnswer[] {
  const found = situation.ways.filter((way) => way.kind === kind);
  if (found.length === 0) {
    return nothing(
      kind === 'between-tables' ? 'no way between tables' : 'no loose seat with something behind',
    );
  }
  return found.map(({ pieceIds, marks, widthMm }) => ({
    pieceIds,
    marks,
    said: plainQuestion(label, widthMm, { lower }),
  }));
}
