import { answered, cellPieces, isWorse, worstFirst, type Found } from './answered.ts';
import { judgementOf, type CheckInput } from './check-input.ts';
import type { PublicRow } from './fit-sheet.ts';
import { sinkUnder, type Answer, type Asked, type PersonCheck, type Said } from './person-check.ts';
import { PERSON_CHECKS } from './person-checks.ts';
import type { Rule } from './rule-book.ts';
import { REFERENCE_SITTER_KG } from './seat-sink.ts';
import type { PlaceSituation } from './situation.ts';
import { unlikePlaces } from './unlike-places.ts';
import type { Judgement } from './verdict.ts';

/**
 * The public: each rule at the end of the population it protects, at the place where that is worst.
 *
 * @param input - as for `checkSet`
 * @returns one cell for each rule of a person
 */
export function publicRowOf(input: CheckInput): PublicRow {
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
