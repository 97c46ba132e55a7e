import { kneeDepthNeededMm, ruleNumber, type RuleBook } from '@settlewright/anthropometry';
import { radians } from '../units/angle.ts';

/** What of the rules says how pieces and ways are measured; millimetres and radians. */
export interface Limits {
  /** What hangs higher than this is in nobody's way. */
  overHeadsMm: number;
  slidePast: {
    /** Floor before the seat that somebody needs to step out over. */
    stepOutMm: number;
    /** Nobody leaves through less than this. */
    narrowestMm: number;
    /** What ends lower is stepped over, what begins higher is leaned under. */
    bodyMm: readonly [number, number];
  };
  /** Clear floor beside a bench: as wide and as long as a wheelchair. */
  floorMm: readonly [number, number];
  /** Side of the square that a T for turning lies within. */
  teeSquareMm: number;
  kneeSpace: {
    /** Heights at which the knee space is measured, lowest first; toes lie below the first. */
    heightsMm: readonly number[];
    /** Space deeper than this does not count. */
    deepestMm: number;
    shallowestMm: number;
    widthMm: number;
  };
  legs: {
    /** Legs deeper under the table than this are between nobody's knees. */
    kneeZoneMm: number;
    /** Room outside the outermost leg narrower than this is of no use to a sitter. */
    usableEndMm: number;
  };
  tables: {
    /** Tables within this of the seat front belong to a bench: over the seat, negative, and before it. */
    servesMm: readonly [number, number];
    /** Tables nearer than this are pushed together and leave no way. */
    togetherMm: number;
  };
  /** Sitters this near to looking straight apart sit back to back. */
  opposedRad: number;
  /** Benches this near to looking the same way are rows. */
  sameWayRad: number;
  wall: {
    /** A wall within this of the rear line of a bench is the wall it stands at. */
    withinMm: number;
    parallelRad: number;
  };
}

/**
 * The limits of the rules of pieces and ways.
 *
 * @param ruleBook - the rules
 * @returns each limit from the rule that names it
 * @throws RangeError when the book lacks a rule or a rule lacks a number
 * @source rules EGRESS-01, -04, -05, -08, HEAD-03, ACC-03, -04, -06, -08 and TABLE-10
 */
export function limitsOf(ruleBook: Pick<RuleBook, 'rule'>): Limits {
  const number = (id: string, name: string) => ruleNumber(ruleBook.rule(id), name);
  const knee = ruleBook.rule('ACC-06');
  const [from, to] = [ruleNumber(knee, 'kneeFrom'), ruleNumber(knee, 'kneeTo')];
  const step = ruleNumber(knee, 'kneeRise') / 2;
  return {
    overHeadsMm: number('HEAD-03', 'pass'),
    slidePast: {
      stepOutMm: number('EGRESS-08', 'stepOut'),
      narrowestMm: number('EGRESS-08', 'narrowest'),
      bodyMm: [number('EGRESS-08', 'steppedOver'), number('EGRESS-08', 'leanedUnder')],
    },
    floorMm: [number('ACC-04', 'width'), number('ACC-04', 'length')],
    teeSquareMm: number('ACC-08', 'square'),
    kneeSpace: {
      heightsMm: Array.from({ length: Math.round((to - from) / step) + 1 }, (_, n) => from + n * step),
      deepestMm: ruleNumber(knee, 'toeUpper'),
      shallowestMm: kneeDepthNeededMm(knee, to),
      widthMm: ruleNumber(knee, 'width'),
    },
    legs: { kneeZoneMm: number('TABLE-10', 'kneeZone'), usableEndMm: number('TABLE-10', 'usableEnd') },
    tables: {
      servesMm: [-number('EGRESS-01', 'overSeat'), number('EGRESS-01', 'beforeSeat')],
      togetherMm: number('EGRESS-01', 'together'),
    },
    opposedRad: radians(number('EGRESS-04', 'opposed')),
    sameWayRad: radians(number('EGRESS-05', 'sameWay')),
    wall: {
      withinMm: number('ACC-03', 'wallWithin'),
      parallelRad: radians(number('ACC-03', 'wallParallel')),
    },
  };
}
