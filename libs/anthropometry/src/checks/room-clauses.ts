import { clauseOf, partMaker } from './clause.ts';
import { nothing, notAsked, type PieceCheck } from './piece-check.ts';
import { ruleNumber, type Rule } from './rule-book.ts';

/** A share that comes out whole is not rounded up by the last digit. */
const WHOLE = 1e-9;

/**
 * Places for wheelchair users among the places at tables. A table marked accessible offers as many as stand side by
 * side in the widest free stretch of an edge nobody else sits at.
 *
 * @source rule ACC-07
 */
export const accessiblePlaces: PieceCheck = {
  id: 'ACC-07',
  ask({ situation, rule, tolerance }) {
    const { tables } = situation;
    if (tables.length === 0) return nothing('no table');
    const kept = tables.filter(({ accessible }) => accessible);
    if (kept.length === 0) return notAsked('no table is marked accessible');
    const each = ruleNumber(rule, 'placeWidth');
    const accessible = kept.reduce(
      (sum, { kneeSpace }) => sum + Math.floor(kneeSpace.widthMm / each + WHOLE),
      0,
    );
    const seats = tables.reduce(
      (sum, { edges }) => sum + edges.reduce((own, { placeIds }) => own + placeIds.length, 0),
      accessible,
    );
    const part = partMaker(tolerance)(`accessible of ${seats} places`, accessible, {
      lower: accessiblePlacesNeeded(rule, seats),
    });
    return [
      {
        pieceIds: kept.map(({ pieceId }) => pieceId),
        marks: kept.map(({ mark }) => mark),
        said: clauseOf(rule, [part]),
      },
    ];
  },
};

/**
 * Accessible places that so many places at tables ask for.
 *
 * @param rule - ACC-07
 * @param places - places at dining surfaces; whole, >= 0
 * @returns whole places, one at least
 * @source rule ACC-07
 */
export const accessiblePlacesNeeded = (rule: Rule, places: number): number =>
  Math.max(ruleNumber(rule, 'least'), Math.ceil(ruleNumber(rule, 'share') * places - WHOLE));

/**
 * Room to turn a wheelchair at the spot that the set marks: a circle, or a T.
 *
 * @source rule ACC-08
 */
export const turningSpace: PieceCheck = {
  id: 'ACC-08',
  ask({ situation, rule, tolerance }) {
    const { turning } = situation;
    if (turning === undefined) return notAsked('no spot for turning round is marked');
    const part = partMaker(tolerance);
    const circle = part('clear circle', turning.circleMm, { lower: ruleNumber(rule, 'circle') });
    const tee = part('arms of a T', turning.teeArmMm, { lower: ruleNumber(rule, 'arm') });
    const said = clauseOf(rule, [!circle.inside && tee.inside ? tee : circle]);
    return [{ pieceIds: [], marks: [], said }];
  },
};

/**
 * Clear width of the door on the way in.
 *
 * @source rule ACC-09
 */
export const doorWidth: PieceCheck = {
  id: 'ACC-09',
  ask({ settings, rule, tolerance }) {
    const { door } = settings;
    if (!door) return notAsked('the clear width of the door is not given');
    const isDeep = door.depthMm > ruleNumber(rule, 'deepFrom') + tolerance;
    const lower = ruleNumber(rule, isDeep ? 'deepWidth' : 'width');
    const label = isDeep ? 'clear width of the deep opening' : 'clear width';
    return [
      {
        pieceIds: [],
        marks: [],
        said: clauseOf(rule, [partMaker(tolerance)(label, door.clearWidthMm, { lower })]),
      },
    ];
  },
};

/**
 * Spaces for wheelchairs among the fixed seats of a set.
 *
 * @source rule ACC-10
 */
export const wheelchairSpaces: PieceCheck = {
  id: 'ACC-10',
  ask({ settings, situation, rule, tolerance }) {
    const spaces = settings.wheelchairSpaces;
    if (spaces === undefined) return notAsked('the wheelchair spaces kept are not given');
    const seats = situation.benches.reduce((sum, { placeIds }) => sum + placeIds.length, 0);
    const least = ruleNumber(rule, 'leastSeats');
    if (seats < least) {
      return nothing(
        `fewer than ${least} fixed seats, outside the table of the clause: one space is advised`,
      );
    }
    const part = partMaker(tolerance)(`spaces among ${seats} fixed seats`, spaces, {
      lower: wheelchairSpacesNeeded(rule, seats),
    });
    return [{ pieceIds: [], marks: [], said: clauseOf(rule, [part]) }];
  },
};

/**
 * Wheelchair spaces that so many fixed seats ask for. The rule's numbers are the table of the clause: `upTo25` spaces
 * up to 25 seats; beyond the last of these one more for every `upTo5000Each` seats or part; beyond that from
 * `over5000` on.
 *
 * @param rule - ACC-10
 * @param seats - whole, >= 4
 * @returns whole spaces
 * @source rule ACC-10
 */
export function wheelchairSpacesNeeded(rule: Rule, seats: number): number {
  const names = Object.keys(rule.numbers);
  const ends = (pattern: RegExp) =>
    names.map((name) => Number(pattern.exec(name)?.[1])).filter(Number.isFinite);
  const bands = ends(/^upTo(\d+)$/).sort((a, b) => a - b);
  const band = bands.find((upTo) => seats <= upTo);
  if (band !== undefined) return ruleNumber(rule, `upTo${band}`);
  const beyond = (from: number, each: string) => Math.ceil((seats - from) / ruleNumber(rule, each));
  const [top = 0] = bands.slice(-1);
  const [last = 0] = ends(/^upTo(\d+)Each$/);
  return seats <= last
    ? ruleNumber(rule, `upTo${top}`) + beyond(top, `upTo${last}Each`)
    : ruleNumber(rule, `over${last}`) + beyond(last, `over${last}Each`);
}
