import type { BodyModel } from '../people/body-model.ts';
import { best } from './amount.ts';
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
import { sinkUnder, type Answer, type Asked, type PersonCheck, type Said } from './person-check.ts';
import { PERSON_CHECKS } from './person-checks.ts';
import type { CheckSettings, PieceAnswer, PieceAsked, Seated } from './piece-check.ts';
import { PIECE_CHECKS } from './piece-checks.ts';
import type { Rule, RuleBook } from './rule-book.ts';
import { REFERENCE_SITTER_KG } from './seat-sink.ts';
import type { PlaceSituation, SetSituation } from './situation.ts';
import { unlikePlaces } from './unlike-places.ts';
import { find, judge, writeOut, type Judgement } from './verdict.ts';

/** Everything a fit sheet is made from. */
export interface CheckInput {
  situation: SetSituation;
  sitters: readonly Sitter[];
  ruleBook: RuleBook;
  model: BodyModel;
  settings: CheckSettings;
  /** Leaves the row of the public empty, where many sets are tried for the same sitters. */
  sittersOnly?: boolean;
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
    publicRow: input.sittersOnly ? { cells: [] } : publicRowOf(input),
    piecesAndWays: PIECE_CHECKS.flatMap(({ id, ask }) => {
      const rule = ruleBook.rule(id);
      const judgement = judgementOf(input, rule);
      const asked: PieceAsked = { ...input, rule, seated, places, tolerance: judgement.tolerance };
      return ask(asked).map((answer) => pieceCell(rule, answer, judgement));
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
 * @returns the row that `checkSet` would make of this sitter
 * @throws RangeError as `checkSet`
 */
export function checkSitter(input: Omit<CheckInput, 'sitters'>, sitter: Sitter): SitterRow {
  const place = input.situation.places.find(({ placeId }) => placeId === sitter.placeId);
  return rowOf(input, sitter, place);
}

const confidenceOf = ({ ruleBook, settings }: Pick<CheckInput, 'ruleBook' | 'settings'>): number =>
  settings.confidence ?? ruleBook.confidence;

/** How sure the verdicts of a rule must be here. */
export const judgementOf = (input: Pick<CheckInput, 'ruleBook' | 'settings'>, rule: Rule): Judgement => ({
  confidence: confidenceOf(input),
  tolerance: input.ruleBook.boundaryTolerance[rule.unit],
});

function rowOf(
  input: Omit<CheckInput, 'sitters'>,
  sitter: Sitter,
  place: PlaceSituation | undefined,
): SitterRow {
  const { ruleBook, model, settings } = input;
  const { lensHeightMm } = settings;
  const body = model.predict(sitter.person);
  const sink = sinkUnder(place?.foam, body);
  const cells = PERSON_CHECKS.map((check): FitCell => {
    const rule = ruleBook.rule(check.id);
    const placed: Answered = place
      ? answered(
          check.ask({ rule, place, name: sitter.name, body, sink, model, lensHeightMm }),
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
      outcome: sitter.noBody ? untold(placed.outcome) : placed.outcome,
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

/** A verdict about nobody: there is no body to measure either. */
const untold = (outcome: Outcome): Outcome =>
  outcome.kind === 'verdict' ? { ...outcome, verdict: 'notKnown', estimated: true, settleWith: [] } : outcome;

interface Answered {
  outcome: Outcome;
  pieces: { pieceId: string; mark: string }[];
  side?: 'left' | 'right';
}

/** Judges what a rule said; of several answers the one with the least room stands. */
function answered(said: Said, judgement: Judgement): Answered {
  if ('reason' in said) {
    const { kind = 'doesNotApply', reason } = said;
    return { outcome: { kind, reason }, pieces: [] };
  }
  if ('information' in said) {
    const { value, words } = said.information;
    return { outcome: { kind: 'information', value: best(value), words }, pieces: [] };
  }
  const [{ answer, finding }] = worstFirst(said, judgement);
  const { question, pieces = [], side } = answer;
  return {
    outcome: writeOut(question, finding, judgement),
    pieces,
    ...(side ? { side } : {}),
  };
}

/** One thing a rule looked at and what was found. */
export interface Found {
  answer: Answer;
  finding: ReturnType<typeof find>;
}

/** At least one answer, the worst first. */
export function worstFirst(answers: readonly Answer[], judgement: Judgement): [Found, ...Found[]] {
  const found = answers.map((answer): Found => ({ answer, finding: find(answer.question, judgement) }));
  found.sort((a, b) => (isWorse(a.finding, b.finding) ? -1 : isWorse(b.finding, a.finding) ? 1 : 0));
  return found as [Found, ...Found[]];
}

type Ranked = Pick<VerdictOutcome, 'verdict' | 'margin'>;

function isWorse(a: Ranked, b: Ranked): boolean {
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
  const { ruleBook } = input;
  const places = unlikePlaces(input.situation.places);
  const cells = PERSON_CHECKS.map((check) => {
    const personal = ruleBook.rule(check.id);
    const rule = personal.publicRule ? ruleBook.rule(personal.publicRule) : personal;
    const judgement = judgementOf(input, rule);
    const { said, place } = worstPlace(input, places, check, rule, judgement);
    const { outcome, pieces, side } = answered(said, judgement);
    return {
      id: `${rule.id}|public`,
      ruleId: rule.id,
      scope: rule.scope,
      ...(place ? { placeId: place.placeId } : {}),
      ...cellPieces(place, pieces),
      ...(side ? { side } : {}),
      outcome,
      readAs: rule.publicRead?.readAs ?? 'a named sitter',
    };
  });
  return { cells };
}

/** What a rule says of the public at the place where that is worst; a verdict stands before any silence. */
function worstPlace(
  input: CheckInput,
  places: readonly PlaceSituation[],
  check: PersonCheck,
  rule: Rule,
  judgement: Judgement,
): { said: Said; place?: PlaceSituation } {
  let silent: { said: Said; place?: PlaceSituation } = { said: { reason: 'no place' } };
  let worst: { said: Answer[]; place: PlaceSituation; finding: Found['finding'] } | undefined;
  for (const place of places) {
    const said = askPublic(check, publicAsked(input, rule, place));
    if (!Array.isArray(said)) {
      if (!silent.place) silent = { said, place };
      continue;
    }
    const [{ answer, finding }] = worstFirst(said, judgement);
    if (!worst || isWorse(finding, worst.finding)) worst = { said: [answer], place, finding };
  }
  return worst ?? silent;
}

const askPublic = (check: PersonCheck, asked: Asked): Said => (check.askPublic ?? check.ask)(asked);

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
