import { TAPE_MEASURE_KEYS, type MeasureKey } from '../measures/measures.ts';
import type { Body } from '../people/body.ts';
import type { KnownPerson } from '../people/person.ts';
import { minus, ofBody, type Amount } from './amount.ts';
import { worstFirst, type Found } from './answered.ts';
import { judgementOf, type CheckInput } from './check-input.ts';
import { failLines } from './fail-lines.ts';
import { sinkUnder, type PersonCheck, type Said } from './person-check.ts';
import { PERSON_CHECKS } from './person-checks.ts';
import type { Rule } from './rule-book.ts';
import type { PlaceSituation } from './situation.ts';
import { differenceOf, shareSettledBy, type Difference, type Spread } from './stand-in-difference.ts';
import type { Judgement, Question } from './verdict.ts';

/** One measure that a rule reads, of the stand-in less the cast member: above 0 where the stand-in has more. */
export interface PartDifference extends Spread {
  key: MeasureKey;
}

/**
 * What a stand-in's sit is worth for one check.
 *
 * - `carriesOver`: what the sit shows holds for the cast member as it is;
 * - `withDifference`: it holds once the difference is added to the gap that was measured;
 * - `cannotTell`: the difference is not known well enough for the room there is;
 * - `notAsked`: the check says nothing at this place.
 */
export type StandInAnswer = 'carriesOver' | 'withDifference' | 'cannotTell' | 'notAsked';

/** One check of a seat that somebody tries for somebody else. Lengths in the rule's unit. */
export interface StandInCheck {
  ruleId: string;
  answer: StandInAnswer;
  /** Words of a check that is not asked. */
  reason?: string;
  /** What the rule reads of a body, stand-in less cast member. */
  parts: PartDifference[];
  /** Added to the room that the stand-in has, gives the room the cast member has; shoes, clothes and cushion included. */
  difference?: Spread;
  /** Room to the nearest fail line that the drawing gives each of them. */
  room?: { castMember: number; standIn: number };
  /**
   * What an answer that carries over rests on. `bodies`: the two do not differ in what the check reads. `room`: they
   * may, and both still have room as drawn, or neither has; the sit by itself shows no more than that.
   */
  because?: 'bodies' | 'room';
  /** The bodies differ here by more than the rule book lets a sit be carried over; whatever the answer, the sit says little. */
  saysLittle: boolean;
  /** The sit by itself would show the wrong thing with the probability that a verdict asks for. */
  misleads: boolean;
  /**
   * `lessRoom`: the stand-in has less room, so a seat with room for the stand-in has room for the cast member. `moreRoom`:
   * the stand-in has more. `same`: neither has. `notKnown`: it is not sure which of the two has less.
   */
  side: 'lessRoom' | 'moreRoom' | 'same' | 'notKnown';
  /** For a sit that cannot tell: the measurement, of either of them, that narrows the difference most. */
  take?: { of: 'castMember' | 'standIn'; key: MeasureKey };
}

/** A tape, a scale and a wall to stand at. */
const TAKEABLE = new Set<MeasureKey>(['stature', 'weight_kg', ...TAPE_MEASURE_KEYS]);

/**
 * How far a stand-in's sit can be trusted, check by check.
 *
 * A sit tries the seat as built, whose numbers are not taken from the drawing. Write `e` for what the built seat
 * differs from the drawn one in the direction a rule reads. The stand-in then finds the room `s + e` and the cast
 * member would find `c + e`, where `s` and `c` are what the drawing gives each body. So the cast member's room is the
 * stand-in's plus `c − s`, whatever `e` is: the seat falls out and only the difference of two bodies is left, with
 * their shoes, clothes and the sinking of the cushion under each. Two people are independent once what is known of
 * each is taken into account, so the variances add; one and the same person differs by nothing.
 *
 * The sit carries over when both find the same (room, or none) with the probability that a verdict asks for. With the
 * difference added it still answers when the drawn room of the cast member, with only the difference in doubt, is on
 * one side of the fail line with that probability; otherwise the difference is wider than the room left.
 *
 * Rules whose limit is a share of a body measure (BACK-03, SEAT-04, TABLE-05) are compared by the room to the fail
 * line, not by the bare gap.
 *
 * Two bodies far apart do not sit a seat alike: a knee over the edge, a back off the rest. No sum makes up for that, so
 * from the difference that the rule book names (`standIn`) the sit says little, even where there is room for both.
 *
 * @param input - place (millimetres), both people, rules, body model and settings; other seats do not matter
 * @returns one entry a rule of a person, in the order of the sheet
 * @throws RangeError when somebody's known values are not positive numbers or a rule lacks a number
 * @source derived above; room and lines as in `find`, probability as in the rule book
 */
export function standIn(
  input: Pick<CheckInput, 'ruleBook' | 'model' | 'settings'> & {
    place: PlaceSituation;
    castMember: KnownPerson;
    standIn: KnownPerson;
  },
): StandInCheck[] {
  const bodies: Bodies = {
    castMember: input.model.predict(input.castMember),
    standIn: input.model.predict(input.standIn),
  };
  return PERSON_CHECKS.map((check) => checkFor(input, check, bodies));
}

interface Bodies {
  castMember: Body;
  standIn: Body;
}

type Input = Parameters<typeof standIn>[0];
type Side = 'lower' | 'upper';

function checkFor(input: Input, check: PersonCheck, bodies: Bodies): StandInCheck {
  const rule = input.ruleBook.rule(check.id);
  const judgement = judgementOf(input, rule);
  const askedOf = (body: Body): Said =>
    check.ask({
      rule,
      place: input.place,
      name: '',
      body,
      sink: sinkUnder(input.place.foam, body),
      model: input.model,
      lensHeightMm: input.settings.lensHeightMm,
    });
  const [castSaid, standInSaid] = [askedOf(bodies.castMember), askedOf(bodies.standIn)];
  if (!Array.isArray(castSaid) || !Array.isArray(standInSaid)) return silent(rule.id, castSaid);
  const [castMember] = worstFirst(castSaid, judgement);
  const other = standInSaid[castSaid.indexOf(castMember.answer)];
  if (!other) return silent(rule.id, castSaid);
  const [sat] = worstFirst([other], judgement);
  return compared(rule, { castMember, standIn: sat }, bodies, {
    ...judgement,
    littleSaidMm: input.ruleBook.standIn.littleSaidMm,
  });
}

function silent(ruleId: string, said: Said): StandInCheck {
  const reason = 'reason' in said ? said.reason : 'no verdict is given here';
  return {
    ruleId,
    answer: 'notAsked',
    reason,
    parts: [],
    saysLittle: false,
    misleads: false,
    side: 'notKnown',
  };
}

function compared(
  { id: ruleId, unit }: Rule,
  { castMember, standIn: sat }: Record<keyof Bodies, Found>,
  bodies: Bodies,
  { confidence, tolerance, littleSaidMm }: Judgement & { littleSaidMm: number },
): StandInCheck {
  const { side, margin } = castMember.finding;
  const rooms = {
    castMember: roomTo(castMember.answer.question, side),
    standIn: roomTo(sat.answer.question, side),
  };
  const change = minus(rooms.castMember, rooms.standIn);
  const difference = differenceOf(change);
  const asked = confidence - ROUNDING;
  const agree = agreement(castMember, sat, bodies);
  // The cast member's drawn room with only the difference in doubt: on one side of the line, or astride it.
  const inside = difference.atLeast(difference.spread.best - margin - tolerance);
  const told = Math.max(inside, 1 - inside) >= asked;
  const answer = agree >= asked ? 'carriesOver' : told ? 'withDifference' : 'cannotTell';
  const lean = sideOf(difference, tolerance, asked);
  const take = answer === 'cannotTell' ? bestTaken(change, bodies) : undefined;
  return {
    ruleId,
    answer,
    parts: partsOf(rooms, bodies),
    difference: difference.spread,
    room: { castMember: margin, standIn: sat.finding.margin },
    ...(answer === 'carriesOver' ? { because: lean === 'same' ? 'bodies' : 'room' } : {}),
    saysLittle: unit === 'mm' && Math.abs(difference.spread.best) > littleSaidMm,
    misleads: 1 - agree >= asked,
    side: lean,
    ...(take ? { take } : {}),
  };
}

/** Probability that both find room within the fail lines of the drawn seat, or neither does. */
function agreement({ finding: a }: Found, { finding: b }: Found, bodies: Bodies): number {
  if (bodies.castMember === bodies.standIn) return 1;
  const [p, q] = [a.probability.insideFail, b.probability.insideFail];
  return p * q + (1 - p) * (1 - q);
}

const ROUNDING = 1e-9;

/** Room from the value to the fail line on one side; above 0 inside. */
function roomTo(question: Question, side: Side): Amount {
  const line = failLines(question)[side] ?? question.pass[side];
  if (!line) throw new Error(`A rule has no ${side} line for one body and has it for another`);
  return side === 'lower' ? minus(question.value, line) : minus(line, question.value);
}

function sideOf(difference: Difference, tolerance: number, asked: number): StandInCheck['side'] {
  const notLess = difference.atLeast(-tolerance) >= asked;
  const notMore = 1 - difference.atLeast(tolerance) >= asked;
  if (notLess && notMore) return 'same';
  return notLess ? 'lessRoom' : notMore ? 'moreRoom' : 'notKnown';
}

/** Measures that either room hangs on, in the order in which the rule names them. */
function partsOf(rooms: Record<keyof Bodies, Amount>, bodies: Bodies): PartDifference[] {
  const keys = new Set<MeasureKey>();
  for (const { terms } of Object.values(rooms)) {
    for (const { parts } of terms) for (const [key, factor] of parts) if (factor !== 0) keys.add(key);
  }
  return [...keys].map((key) => {
    const { spread } = differenceOf(minus(ofBody(bodies.standIn, key), ofBody(bodies.castMember, key)));
    return { key, ...spread };
  });
}

/** The measurement that takes most of the variance out of the difference. */
function bestTaken(change: Amount, bodies: Bodies): StandInCheck['take'] {
  let found: { of: keyof Bodies; key: MeasureKey; share: number } | undefined;
  for (const whose of ['castMember', 'standIn'] as const) {
    const body = bodies[whose];
    const parts = change.terms.find((term) => term.body === body)?.parts ?? [];
    for (const [key] of parts) {
      if (!TAKEABLE.has(key) || body.isMeasured(key)) continue;
      const share = shareSettledBy(change, body, key);
      if (!found || share > found.share) found = { of: whose, key, share };
    }
  }
  return found ? { of: found.of, key: found.key } : undefined;
}
