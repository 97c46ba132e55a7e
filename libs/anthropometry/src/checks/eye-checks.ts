import { best, fixed, minus, plus, type Amount } from './amount.ts';
import { nearestStack, stackWords, type BoxStack } from './apple-boxes.ts';
import type { LedgerLine } from './fit-sheet.ts';
import { measureEntry, pressedSeat, sinkUnder, type Asked, type PersonCheck } from './person-check.ts';
import { nothing, notAsked, type PieceAnswer, type PieceAsked, type PieceCheck } from './piece-check.ts';
import { fixedSide, ledgerOf, question, sumOf, type Entry } from './question.ts';
import { ruleNumber } from './rule-book.ts';
import { besideSills } from './side-checks.ts';
import type { Question } from './verdict.ts';

const RADIANS = Math.PI / 180;

/** Eye of a sitter at ease over the floor, with the lines that lead to it. */
function eyeAtEase(asked: Asked): { entries: Entry[]; ledger: () => LedgerLine[] } {
  const { height, ledger } = pressedSeat(asked, 'hip');
  const slump = ruleNumber(asked.rule, 'slump');
  const entries: Entry[] = [
    ['seat', height],
    measureEntry(asked.body, 'eye_height_sitting'),
    ['sitting at ease', fixed(-slump)],
  ];
  return { entries, ledger };
}

/**
 * View over the sill: the eye of a sitter at ease over the sill's top.
 *
 * @source rule SILL-05
 */
export const viewOverSill: PersonCheck = {
  id: 'SILL-05',
  ask: (asked) =>
    besideSills(asked, (sill) => {
      const { rule } = asked;
      const { entries, ledger } = eyeAtEase(asked);
      const over: Entry[] = [...entries, [`less the top of ${sill.mark}`, fixed(-sill.topMm)]];
      return question({
        value: sumOf(over),
        setLedger: () => [...ledger(), ...ledgerOf(over, 'eye over the sill')],
        lower: fixedSide(ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail')),
      });
    }),
};

/**
 * Downward view past the sill: the angle from the eye down to the sill's far edge, compared as the height that the
 * angle takes over the distance, so that it stays a sum of measures.
 *
 * @source rule SILL-06
 */
export const viewPastSill: PersonCheck = {
  id: 'SILL-06',
  ask: (asked) =>
    besideSills(asked, (sill) => {
      const { rule } = asked;
      const { entries, ledger } = eyeAtEase(asked);
      const over: Entry[] = [...entries, [`less the top of ${sill.mark}`, fixed(-sill.topMm)]];
      const value = sumOf(over);
      const toFarEdgeMm = sill.centreToEdgeMm + sill.usableDepthMm;
      const rise = (degrees: number) => toFarEdgeMm * Math.tan(degrees * RADIANS);
      const [pass, fail] = [ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail')];
      return question({
        value,
        setLedger: () => {
          const down = Math.round(sightAngleDeg(best(value), toFarEdgeMm) * 10) / 10;
          return [...ledger(), ...ledgerOf(over, `eye over the sill, looking ${down}° down past it`)];
        },
        lower: {
          pass: [[`${pass}° down over the sill’s far edge`, fixed(rise(pass))]],
          further: [[`only ${fail}° down`, fixed(rise(fail) - rise(pass))]],
        },
      });
    }),
  askPublic: () => ({ reason: 'asked of a named sitter only' }),
};

/**
 * Angle at which one looks down to an edge.
 *
 * @param eyeOverMm - eye over the edge; finite
 * @param awayMm - level distance to the edge; finite, > 0
 * @returns degrees below level
 * @source rule SILL-06
 */
export const sightAngleDeg = (eyeOverMm: number, awayMm: number): number =>
  Math.atan2(eyeOverMm, awayMm) / RADIANS;

/**
 * Lens at the sitter's eyes: the eye of a sitter at ease against the height of the lens.
 *
 * @source rule HEAD-05
 */
export const lensAtEye: PersonCheck = {
  id: 'HEAD-05',
  ask(asked) {
    const { lensHeightMm, rule } = asked;
    if (lensHeightMm === undefined) {
      return { kind: 'notAsked', reason: 'the height of the lens is not given' };
    }
    const { entries, ledger } = eyeAtEase(asked);
    const [pass, fail] = [ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail')];
    const lens: Entry = ['lens over the floor', fixed(lensHeightMm)];
    const side = (sign: number) => ({
      pass: [lens, [sign > 0 ? 'eye a little higher' : 'eye a little lower', fixed(sign * pass)]] as Entry[],
      further: [['allowance for tight', fixed(sign * (fail - pass))]] as Entry[],
    });
    return [
      {
        question: question({
          value: sumOf(entries),
          setLedger: () => [...ledger(), ...ledgerOf(entries, 'eye over the floor')],
          lower: side(-1),
          upper: side(1),
        }),
      },
    ];
  },
  askPublic: () => ({ reason: 'asked of a named sitter only' }),
};

/** Somebody's eye over the floor. */
interface Eye {
  name: string;
  height: Amount;
  atMm: number;
}

/**
 * Eye lines of two who face each other, with the stack of apple boxes under the lower eye that comes nearest.
 * The verdict is about what the boxes at hand leave, not about an ideal riser.
 *
 * @source rule HEAD-04
 */
export const eyeLines: PieceCheck = {
  id: 'HEAD-04',
  ask(asked) {
    const { settings, situation, seated } = asked;
    const { appleBoxes } = settings;
    if (!appleBoxes) return notAsked('the apple boxes at hand are not given');
    const pairs = situation.facing.flatMap(({ pairs: opposite, ...benches }) =>
      opposite.map((pair) => ({ ...benches, pair })),
    );
    const answers = pairs.flatMap(({ pieceIds, marks, pair }): PieceAnswer[] => {
      const [one, other] = pair.map((placeId) => eyeOf(asked, placeId));
      if (one === undefined || other === undefined) return [];
      const [lower, higher] = one.atMm <= other.atMm ? [one, other] : [other, one];
      const stack = nearestStack(asked.rule, appleBoxes, higher.atMm - lower.atMm);
      return [{ pieceIds, marks, part: pair.join('+'), said: levelQuestion(asked, lower, higher, stack) }];
    });
    if (answers.length > 0) return answers;
    return nothing(
      seated.size > 1 && pairs.length > 0 ? 'nobody sits opposite' : 'no two sitters face each other',
    );
  },
};

function eyeOf(asked: PieceAsked, placeId: string): Eye | undefined {
  const seated = asked.seated.get(placeId);
  const place = asked.places.get(placeId);
  if (!seated || !place) return undefined;
  const { body, name } = seated;
  const sink = sinkUnder(place.foam, body);
  const { height } = pressedSeat({ ...asked, place, name, body, sink }, 'hip');
  const eye = plus(height, measureEntry(body, 'eye_height_sitting')[1]);
  return { name, height: eye, atMm: best(eye) };
}

function levelQuestion({ rule }: PieceAsked, lower: Eye, higher: Eye, stack: BoxStack): Question {
  const [pass, fail] = [ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail')];
  return question({
    value: minus(minus(higher.height, lower.height), fixed(stack.heightMm)),
    setLedger: () =>
      ledgerOf(
        [
          [`${higher.name}’s eye over the floor`, higher.height],
          [`less ${lower.name}’s eye`, minus(fixed(0), lower.height)],
          [`${stackWords(stack)} under ${lower.name}`, fixed(-stack.heightMm)],
        ],
        'left between the two eyes',
      ),
    lower: fixedSide(-pass, -fail),
    upper: fixedSide(pass, fail),
  });
}
