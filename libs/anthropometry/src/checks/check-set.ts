import type { BodyModel } from '../people/body-model.ts';
import type {
  FitCell,
  FitSheet,
  Outcome,
  PublicRow,
  Sitter,
  SitterRow,
  Verdict,
  VerdictOutcome,
} from './fit-sheet.ts';
import { sinkUnder, type Asked, type PersonCheck, type Said } from './person-check.ts';
import { PERSON_CHECKS } from './person-checks.ts';
import type { CheckSettings, PieceAnswer, PieceAsked, Seated } from './piece-check.ts';
import { PIECE_CHECKS } from './piece-checks.ts';
import type { Rule, RuleBook } from './rule-book.ts';
import { REFERENCE_SITTER_KG } from './seat-sink.ts';
import type { PlaceSituation, SetSituation } from './situation.ts';
import { judge, type Judgement } from './verdict.ts';

/** Everything a fit sheet is made from. */
export interface CheckInput {
  situation: SetSituation;
  sitters: readonly Sitter[];
  ruleBook: RuleBook;
  model: BodyModel;
  settings: CheckSettings;
}

/** Worst first: what is not known is never better than tight. */
const WORST_FIRST: readonly Verdict[] = ['wontFit', 'notKnown', 'tight', 'fits'];

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
    sitters.map(({ placeId, name, person }) => [placeId, { name, body: model.predict(person) }]),
  );
  const rows = sitters.map((sitter) => rowOf(input, sitter, places.get(sitter.placeId)));
  const counts: Record<Verdict, number> = { fits: 0, tight: 0, wontFit: 0, notKnown: 0 };
  for (const { cells } of rows) {
    for (const { outcome } of cells) if (outcome.kind === 'verdict') counts[outcome.verdict] += 1;
  }
  return {
    rows,
    publicRow: publicRowOf(input),
    piecesAndWays: PIECE_CHECKS.flatMap(({ id, ask }) => {
      const rule = ruleBook.rule(id);
      const judgement = judgementOf(input, rule);
      const asked: PieceAsked = { ...input, rule, seated, places, tolerance: judgement.tolerance };
      return ask(asked).map((answer) => pieceCell(rule, answer, judgement));
    }),
    emptyPlaceIds: situation.places.map(({ placeId }) => placeId).filter((id) => !seated.has(id)),
    counts,
    ruleVersion: ruleBook.version,
  };
}

const judgementOf = ({ ruleBook, settings }: CheckInput, rule: Rule): Judgement => ({
  confidence: settings.confidence ?? ruleBook.confidence,
  tolerance: ruleBook.boundaryTolerance[rule.unit],
});

function rowOf(input: CheckInput, sitter: Sitter, place: PlaceSituation | undefined): SitterRow {
  const { ruleBook, model } = input;
  const body = model.predict(sitter.person);
  const cells = PERSON_CHECKS.map((check): FitCell => {
    const rule = ruleBook.rule(check.id);
    const placed: Answered = place
      ? answered(
          check.ask({ rule, place, name: sitter.name, body, sink: sinkUnder(place.foam, body), model }),
          judgementOf(input, rule),
        )
      : { outcome: { kind: 'doesNotApply', reason: 'no such place' }, pieces: [] };
    return {
      id: `${rule.id}|${sitter.placeId}`,
      ruleId: rule.id,
      scope: rule.scope,
      placeId: sitter.placeId,
      sitterId: sitter.id,
      ...cellPieces(place, placed.pieces),
      ...(placed.side ? { side: placed.side } : {}),
      outcome: placed.outcome,
    };
  });
  const found = new Set(
    cells.flatMap(({ outcome }) => (outcome.kind === 'verdict' ? [outcome.verdict] : [])),
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
  };
}

interface Answered {
  outcome: Outcome;
  pieces: { pieceId: string; mark: string }[];
  side?: 'left' | 'right';
}

/** Judges what a rule said; of several answers the one with the least room stands. */
function answered(said: Said, judgement: Judgement): Answered {
  if ('reason' in said) return { outcome: { kind: 'doesNotApply', reason: said.reason }, pieces: [] };
  if ('information' in said) return { outcome: { kind: 'information', ...said.information }, pieces: [] };
  const judged = said.map(({ question, pieces = [], side }) => ({
    outcome: judge(question, judgement),
    pieces,
    ...(side ? { side } : {}),
  }));
  return judged.reduce((a, b) => (isWorse(b.outcome, a.outcome) ? b : a));
}

function isWorse(a: VerdictOutcome, b: VerdictOutcome): boolean {
  const rank = WORST_FIRST.indexOf(a.verdict) - WORST_FIRST.indexOf(b.verdict);
  return rank === 0 ? a.margin < b.margin : rank < 0;
}

function cellPieces(
  place: PlaceSituation | undefined,
  others: readonly { pieceId: string; mark: string }[],
): { pieceIds: string[]; marks: string[] } {
  const pieces = place ? [{ pieceId: place.pieceId, mark: place.mark }, ...others] : others;
  return { pieceIds: pieces.map(({ pieceId }) => pieceId), marks: pieces.map(({ mark }) => mark) };
}

/** The public: each rule at the end of the population it protects, at the place where that is worst. */
function publicRowOf(input: CheckInput): PublicRow {
  const { ruleBook, situation } = input;
  const cells = PERSON_CHECKS.map((check) => {
    const personal = ruleBook.rule(check.id);
    const rule = personal.publicRule ? ruleBook.rule(personal.publicRule) : personal;
    const judgement = judgementOf(input, rule);
    let worst: { answer: Answered; place: PlaceSituation | undefined } = {
      answer: { outcome: { kind: 'doesNotApply', reason: 'no place' }, pieces: [] },
      place: undefined,
    };
    for (const place of situation.places) {
      const answer = answered(askPublic(check, publicAsked(input, rule, place)), judgement);
      if (standsBefore(answer.outcome, worst.answer.outcome)) worst = { answer, place };
    }
    const { answer, place } = worst;
    return {
      id: `${rule.id}|public`,
      ruleId: rule.id,
      scope: rule.scope,
      ...(place ? { placeId: place.placeId } : {}),
      ...cellPieces(place, answer.pieces),
      ...(answer.side ? { side: answer.side } : {}),
      outcome: answer.outcome,
      readAs: rule.publicRead?.readAs ?? 'a named sitter',
    };
  });
  return { cells };
}

const askPublic = (check: PersonCheck, asked: Asked): Said => (check.askPublic ?? check.ask)(asked);

/** A verdict stands before any silence; of two verdicts the worse. */
function standsBefore(a: Outcome, b: Outcome): boolean {
  if (a.kind !== 'verdict') return b.kind === 'doesNotApply' && b.reason === 'no place';
  return b.kind !== 'verdict' || isWorse(a, b);
}

function publicAsked({ model }: CheckInput, rule: Rule, place: PlaceSituation): Asked {
  const { bodyData, measure, percentile, readAs = 'anyone' } = rule.publicRead ?? {};
  const person =
    bodyData && measure && percentile ? model.mannequin({ bodyData, measure, percentile }) : REFERENCE_SITTER;
  const body = model.predict(person);
  const name = person === REFERENCE_SITTER ? `a sitter of ${REFERENCE_SITTER_KG} kg` : `the ${readAs}`;
  return { rule, place, name, body, sink: sinkUnder(place.foam, body), model };
}

/** Sits where a rule reads both ends of the population at once. */
const REFERENCE_SITTER = {
  bodyData: 'mixed',
  weightKg: REFERENCE_SITTER_KG,
  measured: {},
  shoeMm: 0,
  clothing: 'medium',
  exact: true,
} as const;

function pieceCell(rule: Rule, answer: PieceAnswer, judgement: Judgement): FitCell {
  const { pieceIds, marks, part, said } = answer;
  const where = [pieceIds.join('+'), ...(part ? [part] : [])].filter(Boolean).join('|');
  return {
    id: `${rule.id}|${where || 'set'}`,
    ruleId: rule.id,
    scope: rule.scope,
    pieceIds,
    marks,
    outcome: 'kind' in said ? said : judge(said, judgement),
  };
}
