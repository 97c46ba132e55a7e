import type { Body } from '../people/body.ts';
import { answered, cellPieces, WORST_FIRST, type Answered } from './answered.ts';
import { confidenceOf, judgementOf, type CheckInput } from './check-input.ts';
import type { FitCell, FitSheet, Outcome, Sitter, SitterRow, Verdict } from './fit-sheet.ts';
import { sinkUnder, type Said } from './person-check.ts';
import { PERSON_CHECKS } from './person-checks.ts';
import type { PieceAnswer, PieceAsked, Seated } from './piece-check.ts';
import { PIECE_CHECKS } from './piece-checks.ts';
import { publicRowOf } from './public-row.ts';
import type { Rule } from './rule-book.ts';
import type { PlaceSituation } from './situation.ts';
import { bodiesIn, hasBorrowed, judge, readsBorrowed, type Judgement } from './verdict.ts';

/**
 * The fit sheet of a set: every sitter against every rule, the public, and the pieces and ways.
 *
 * @param input - what the set offers (millimetres, radians), who sits where, rules, body model and settings
 * @returns rows in the order of the sitters; each row and the public row have the same columns
 * @throws RangeError when a sitter's known values are not positive numbers or a rule lacks a number
 * @source rules as in the rule book; verdicts as in `judge`
 */
export function checkSet(input: CheckInput): FitSheet {
  const { situation, sitters, ruleBook, model } = input;
  const places = new Map(situation.places.map((place) => [place.placeId, place]));
  const seated = new Map<string, Seated>(
    sitters.map(({ placeId, name, person, noBody }) => [
      placeId,
      { name, body: model.predict(person), ...(noBody ? { noBody } : {}) },
    ]),
  );
  const bodiesOfNobody = new Set([...seated.values()].flatMap(({ noBody, body }) => (noBody ? [body] : [])));
  const rows = sitters.map((sitter) => rowOf(input, sitter, places.get(sitter.placeId)));
  const counts: Record<Verdict, number> = { fits: 0, tight: 0, wontFit: 0, notKnown: 0 };
  for (const { cells } of rows) {
    for (const { outcome } of cells) {
      if (outcome.kind === 'verdict') counts[outcome.verdict] += 1;
      else if (outcome === NOT_OF_CHILDREN) counts.notKnown += 1;
    }
  }
  return {
    rows,
    publicRow: input.sittersOnly ? { cells: [] } : publicRowOf(input),
    piecesAndWays: PIECE_CHECKS.flatMap(({ id, ask }) => {
      const rule = ruleBook.rule(id);
      const judgement = judgementOf(input, rule);
      const asked: PieceAsked = { ...input, rule, seated, places, tolerance: judgement.tolerance };
      return ask(asked).map((answer) => pieceCell(rule, answer, judgement, bodiesOfNobody));
    }),
    emptyPlaceIds: situation.places.map(({ placeId }) => placeId).filter((id) => !seated.has(id)),
    counts,
    confidence: confidenceOf(input),
    ruleVersion: ruleBook.version,
  };
}

/**
 * One row of the sheet by itself: a sitter against every rule of a person, without the public and the pieces.
 *
 * @param input - as for `checkSet`
 * @param sitter - whoever is asked about; the sitters of the input do not matter
 * @param ruleIds - rules to ask; every rule of a person when absent
 * @returns the row that `checkSet` would make of this sitter, with the cells of those rules
 * @throws RangeError as `checkSet`
 */
export function checkSitter(
  input: Omit<CheckInput, 'sitters'>,
  sitter: Sitter,
  ruleIds?: readonly string[],
): SitterRow {
  const place = input.situation.places.find(({ placeId }) => placeId === sitter.placeId);
  return rowOf(input, sitter, place, ruleIds && PERSON_CHECKS.filter(({ id }) => ruleIds.includes(id)));
}

function rowOf(
  input: Omit<CheckInput, 'sitters'>,
  sitter: Sitter,
  place: PlaceSituation | undefined,
  checks = PERSON_CHECKS,
): SitterRow {
  const { ruleBook, model, settings } = input;
  const { lensHeightMm } = settings;
  const body = model.predict(sitter.person);
  const sink = sinkUnder(place?.foam, body);
  const cells = checks.map((check): FitCell => {
    const rule = ruleBook.rule(check.id);
    const said = place && check.ask({ rule, place, name: sitter.name, body, sink, model, lensHeightMm });
    const placed: Answered = !said
      ? { outcome: { kind: 'doesNotApply', reason: 'no such place' }, pieces: [] }
      : isBeyondChild(said, body)
        ? { outcome: NOT_OF_CHILDREN, pieces: [] }
        : answered(said, judgementOf(input, rule));
    return {
      id: `${rule.id}|${sitter.placeId}`,
      ruleId: rule.id,
      scope: rule.scope,
      placeId: sitter.placeId,
      sitterId: sitter.id,
      ...cellPieces(place, placed.pieces),
      ...(placed.side ? { side: placed.side } : {}),
      outcome: sitter.noBody ? untold(placed.outcome) : placed.outcome,
    };
  });
  const found = new Set(
    cells.flatMap(({ outcome }): Verdict[] =>
      outcome.kind === 'verdict' ? [outcome.verdict] : outcome === NOT_OF_CHILDREN ? ['notKnown'] : [],
    ),
  );
  return {
    sitterId: sitter.id,
    name: sitter.name,
    kind: sitter.kind,
    placeId: sitter.placeId,
    mark: place?.mark ?? '',
    place: place?.place ?? 0,
    cells,
    worst: WORST_FIRST.find((verdict) => found.has(verdict)) ?? 'notKnown',
    ...(sitter.noBody ? { noBody: sitter.noBody } : {}),
  };
}

/** Instead of a verdict on measures that are not known of children: never a pass. */
const NOT_OF_CHILDREN: Outcome = { kind: 'notAsked', reason: 'not known of a child' };

/** Whether a rule asks or tells more of a child than is known, or asks what is set for grown-ups alone. */
function isBeyondChild(said: Said, { person }: Body): boolean {
  if (!person.child) return false;
  if ('information' in said) return hasBorrowed(said.information.value);
  return (
    Array.isArray(said) &&
    said.some(({ question }) => readsBorrowed(question) || bodiesIn(question).length === 0)
  );
}

/** A verdict about nobody: there is no body to measure either, and none that sinks. */
function untold(outcome: Outcome): Outcome {
  if (outcome.kind !== 'verdict') return outcome;
  const { drops: _drops, settleBySit: _sit, ...rest } = outcome;
  return { ...rest, verdict: 'notKnown', estimated: true, settleWith: [] };
}

function pieceCell(
  rule: Rule,
  answer: PieceAnswer,
  judgement: Judgement,
  bodiesOfNobody: ReadonlySet<Body>,
): FitCell {
  const { pieceIds, marks, part, said } = answer;
  const where = [pieceIds.join('+'), ...(part ? [part] : [])].filter(Boolean).join('|');
  const judged = 'kind' in said ? said : readsBorrowed(said) ? NOT_OF_CHILDREN : judge(said, judgement);
  const ofNobody = !('kind' in said) && bodiesIn(said).some((body) => bodiesOfNobody.has(body));
  return {
    id: `${rule.id}|${where || 'set'}`,
    ruleId: rule.id,
    scope: rule.scope,
    pieceIds,
    marks,
    outcome: ofNobody ? untold(judged) : judged,
  };
}
