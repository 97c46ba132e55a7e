import { clauseOf, partMaker, type ClausePart } from './clause.ts';
import { nothing, notAsked, type PieceCheck } from './piece-check.ts';
import { ruleNumber, type Rule } from './rule-book.ts';
import type { RouteStretch } from './situation.ts';

/**
 * Width of the route that the set marks: wide throughout, or with short narrowings well apart.
 *
 * @source rule EGRESS-03
 */
export const routeWidth: PieceCheck = {
  id: 'EGRESS-03',
  ask({ situation, rule, tolerance }) {
    const { route } = situation;
    if (route === undefined || route.length === 0) return notAsked('no route is marked');
    return [{ pieceIds: [], marks: [], said: clauseOf(rule, routeParts(rule, route, tolerance)) }];
  },
};

/** A stretch narrower than the whole width, and how far after the one before it begins. */
interface Narrowing {
  widthMm: number;
  runMm: number;
  afterMm: number;
}

function routeParts(rule: Rule, route: readonly RouteStretch[], tolerance: number): ClausePart[] {
  const part = partMaker(tolerance);
  const wide = ruleNumber(rule, 'width');
  const narrowings = narrowingsOf(route, wide - tolerance);
  const narrowest = Math.min(...route.map(({ widthMm }) => widthMm));
  if (narrowings.length === 0) return [part('narrowest', narrowest, { lower: wide })];
  const apart = Math.min(...narrowings.map(({ afterMm }) => afterMm));
  return [
    part('narrowest', narrowest, { lower: ruleNumber(rule, 'narrow') }),
    part('longest narrow stretch', Math.max(...narrowings.map(({ runMm }) => runMm)), {
      upper: ruleNumber(rule, 'run'),
    }),
    ...(apart < Infinity
      ? [part('between two narrow stretches', apart, { lower: ruleNumber(rule, 'apart') })]
      : []),
  ];
}

function narrowingsOf(route: readonly RouteStretch[], wide: number): Narrowing[] {
  const found: Narrowing[] = [];
  let current: Narrowing | undefined;
  let sinceMm = Infinity;
  for (const { widthMm, lengthMm } of route) {
    if (widthMm >= wide) {
      current = undefined;
      sinceMm += lengthMm;
      continue;
    }
    if (current === undefined) {
      current = { widthMm, runMm: 0, afterMm: sinceMm };
      found.push(current);
    }
    current.widthMm = Math.min(current.widthMm, widthMm);
    current.runMm += lengthMm;
    sinceMm = 0;
  }
  return found;
}

/**
 * Table edge to table edge where diners on chairs sit back to back.
 *
 * @source rule EGRESS-04
 */
export const tablesBackToBack: PieceCheck = {
  id: 'EGRESS-04',
  ask({ situation, rule, tolerance }) {
    const ways = situation.ways.filter(({ kind }) => kind === 'chairs-both-sides');
    if (ways.length === 0) return nothing('no tables with chairs back to back');
    const lower = 2 * ruleNumber(rule, 'chair') + ruleNumber(rule, 'way');
    return ways.map(({ pieceIds, marks, widthMm }) => ({
      pieceIds,
      marks,
      said: clauseOf(rule, [partMaker(tolerance)('table edge to table edge', widthMm, { lower })]),
    }));
  },
};

/**
 * Clear width between two rows of seats.
 *
 * @source rule EGRESS-05; a row that can be left at one end only needs more
 */
export const betweenRows: PieceCheck = {
  id: 'EGRESS-05',
  ask({ situation, rule, tolerance }) {
    const { rows = [] } = situation;
    if (rows.length === 0) return nothing('no rows of seats');
    return rows.map(({ pieceIds, marks, clearMm, seats, openEnds }) => ({
      pieceIds,
      marks,
      said:
        openEnds === 0
          ? { kind: 'notAsked', reason: `the drawing shows no way out of the row of ${marks[0]}` }
          : clauseOf(rule, [
              partMaker(tolerance)(`clear before ${seats} seats`, clearMm, {
                lower: rowNeedMm(rule, seats, openEnds),
              }),
            ]),
    }));
  },
};

/**
 * Clear width that a row of seats needs.
 *
 * @param rule - EGRESS-05
 * @param seats - seats in the row; whole, > 0
 * @param openEnds - ends at which the row meets an aisle
 * @returns millimetres
 * @source rule EGRESS-05
 */
export function rowNeedMm(rule: Rule, seats: number, openEnds: 1 | 2): number {
  const name = openEnds === 2 ? 'twoAisles' : 'oneAisle';
  const beyond = Math.max(0, seats - ruleNumber(rule, `${name}From`));
  return Math.min(
    ruleNumber(rule, 'most'),
    ruleNumber(rule, 'base') + beyond * ruleNumber(rule, `${name}Each`),
  );
}
