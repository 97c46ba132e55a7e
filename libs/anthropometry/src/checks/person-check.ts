import { MEASURE_INFO } from '../measures/measure-info.ts';
import type { MeasureKey } from '../measures/measures.ts';
import type { Body } from '../people/body.ts';
import type { BodyModel } from '../people/body-model.ts';
import { doubted, fixed, moved, ofBody, plus, times, type Amount } from './amount.ts';
import type { LedgerLine } from './fit-sheet.ts';
import { ledgerOf, type Entry } from './question.ts';
import { ruleNumber, type Rule } from './rule-book.ts';
import { seatSinkMm } from './seat-sink.ts';
import { cushionDrop, sinkSpreadMm } from './sink-band.ts';
import type { FoamSituation, PlaceSituation } from './situation.ts';
import type { Question } from './verdict.ts';

/** A rule put to one sitter at one place. */
export interface Asked {
  rule: Rule;
  place: PlaceSituation;
  /** Shown name of the sitter. */
  name: string;
  body: Body;
  sink: Sink;
  model: BodyModel;
  /** Height of the lens over the floor, millimetres; absent where no camera is asked about. */
  lensHeightMm?: number | undefined;
}

/** How far the cushion goes down under a sitter, as far as the weight is known. */
export interface Sink {
  amount: Amount;
  bottomsOut: boolean;
}

/** One thing that a rule looks at: a sill on one hand, a table, a wall. */
export interface Answer {
  question: Question;
  /** Pieces beside the one sat on. */
  pieces?: { pieceId: string; mark: string }[];
  side?: 'left' | 'right';
}

/** What a rule has to say at a place. Of several answers the worse is shown. */
export type Said =
  Answer[] | { reason: string; kind?: 'notAsked' } | { information: { value: Amount; words: string } };

/**
 * A rule of scope `person`. What `ask` says never hangs on best values of the body: it is made of amounts, so that it
 * can be asked once of a stand-in and then judged for any number of bodies. The sums that are shown are made later.
 */
export interface PersonCheck {
  /** Rule for a sitter. */
  id: string;
  ask: (asked: Asked) => Said;
  /** How the public is asked, where that is not `ask` put to the percentile person. */
  askPublic?: (asked: Asked) => Said;
}

const HALF_KILOGRAM = 0.5;
const NO_SINK: Sink = { amount: fixed(0), bottomsOut: false };

/**
 * How far a place's cushion goes down under a body. Around the best weight the sink is taken as straight in the
 * weight, so that a predicted weight keeps its doubt and its link with the other measures. The doubt of the estimate
 * itself stands beside it.
 *
 * @param foam - foam at the place; `undefined` for a hard seat
 * @param body - sitter
 * @returns millimetres as an amount
 * @source `seatSinkMm`, `cushionDrop`
 */
export function sinkUnder(foam: FoamSituation | undefined, body: Body): Sink {
  if (!foam || foam.thicknessMm === 0) return NO_SINK;
  const { weightKg } = body;
  const { sinkMm, bottomsOut } = seatSinkMm(foam, weightKg);
  const doubt = { foam, drop: cushionDrop(foam, weightKg), by: sinkSpreadMm(foam, sinkMm) };
  if (body.isMeasured('weight_kg')) return { amount: doubted(fixed(sinkMm), doubt), bottomsOut };
  const slope =
    seatSinkMm(foam, weightKg + HALF_KILOGRAM).sinkMm - seatSinkMm(foam, weightKg - HALF_KILOGRAM).sinkMm;
  const straight = moved(ofBody(body, 'weight_kg', slope), sinkMm - slope * weightKg);
  return { amount: doubted(straight, doubt), bottomsOut };
}

/** Pressed seat height under the sitter and the sum that leads to it. */
export function pressedSeat(
  asked: Asked,
  at: 'front' | 'hip',
): { height: Amount; ledger: () => LedgerLine[] } {
  const { place, name, sink } = asked;
  const top = at === 'front' ? place.seatTopFrontMm : place.seatTopHipMm;
  return {
    height: plus(fixed(top), sink.amount, -1),
    ledger: () => {
      const cushion = top - place.deckHeightMm;
      const entries: Entry[] = [[`Deck of ${place.mark}`, fixed(place.deckHeightMm)]];
      if (cushion !== 0) {
        entries.push([at === 'front' ? 'cushion' : 'cushion, at the hip', fixed(cushion)]);
      }
      if (sink !== NO_SINK) {
        const words = sink.bottomsOut ? 'sinks, foam bottoms out, under' : 'sinks under';
        entries.push([`${words} ${name}`, times(sink.amount, -1)]);
      }
      return ledgerOf(entries, `seat under ${name}`);
    },
  };
}

/** A measure of the sitter as a line of a sum, in plain words. */
export function measureEntry(body: Body, key: MeasureKey, factor = 1): Entry {
  const { plain } = MEASURE_INFO[key];
  const words = factor === 0.5 ? `half the ${plain}` : plain;
  return [words.charAt(0).toUpperCase() + words.slice(1), ofBody(body, key, factor)];
}

/** Height the shoes add, as a line of a sum. */
export const shoeEntry = (asked: Asked): Entry => ['shoe', fixed(asked.body.person.shoeMm)];

/** What the clothing adds by this rule, millimetres. */
export function clothingOf({ rule, body }: Asked): number {
  const { clothing } = body.person;
  return ruleNumber(rule, `clothing${clothing.charAt(0).toUpperCase()}${clothing.slice(1)}`);
}
