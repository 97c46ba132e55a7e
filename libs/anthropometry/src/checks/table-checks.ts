import { best, fixed, minus, ofBody, times, type Amount } from './amount.ts';
import type { LedgerLine } from './fit-sheet.ts';
import {
  clothingOf,
  measureEntry,
  pressedSeat,
  shoeEntry,
  type Answer,
  type Asked,
  type PersonCheck,
  type Said,
} from './person-check.ts';
import { allowance, fixedSide, ledgerOf, question, type Entry, type Side } from './question.ts';
import { ruleNumber } from './rule-book.ts';
import type { PlaceTableSituation } from './situation.ts';
import type { Question } from './verdict.ts';

const NO_TABLE = { reason: 'no table' };

const withTable = (asked: Asked, ask: (table: PlaceTableSituation) => Question): Said => {
  const { table } = asked.place;
  return table ? [answerOf(table, ask(table))] : NO_TABLE;
};

const answerOf = (table: PlaceTableSituation, asked: Question): Answer => ({
  question: asked,
  pieces: [{ pieceId: table.pieceId, mark: table.mark }],
});

/** Value above the pressed seat, with the sum that leads to it. */
function aboveSeat(
  asked: Asked,
  entry: Entry,
  total: string,
): { value: Amount; setLedger: Question['setLedger'] } {
  const { height, ledger } = pressedSeat(asked, 'hip');
  return {
    value: minus(entry[1], height),
    setLedger: () => [...ledger(), ...ledgerOf([entry, ['less the seat', times(height, -1)]], total)],
  };
}

/**
 * Thigh room: pressed seat to the lowest thing over the lap.
 *
 * @source rule TABLE-01
 */
export const thighRoom: PersonCheck = {
  id: 'TABLE-01',
  ask: (asked) =>
    withTable(asked, (table) => {
      const by = ruleNumber(asked.rule, 'allowance');
      const clothing = clothingOf(asked);
      return question({
        ...aboveSeat(asked, [`Underside of ${table.mark}`, fixed(table.undersideMm)], 'room over the lap'),
        lower: {
          pass: [
            measureEntry(asked.body, 'thigh_clearance'),
            ...(clothing > 0 ? ([['clothing', fixed(clothing)]] as const) : []),
            ['room to move', fixed(by)],
          ],
          further: allowance(-by),
        },
      });
    }),
};

/**
 * Knee room: floor to the lowest thing over the lap.
 *
 * @source rule TABLE-02
 */
export const kneeRoom: PersonCheck = {
  id: 'TABLE-02',
  ask: (asked) =>
    withTable(asked, (table) => {
      const by = ruleNumber(asked.rule, 'allowance');
      return question({
        value: fixed(table.undersideMm),
        setLedger: () =>
          ledgerOf([[`Underside of ${table.mark}`, fixed(table.undersideMm)]], 'room over the floor'),
        lower: {
          pass: [
            measureEntry(asked.body, 'knee_height_sitting'),
            shoeEntry(asked),
            ['room to move', fixed(by)],
          ],
          further: allowance(-by),
        },
      });
    }),
};

/**
 * Table height: pressed seat to the table top against the resting elbow.
 *
 * @source rule TABLE-05
 */
export const tableHeight: PersonCheck = {
  id: 'TABLE-05',
  ask: (asked) =>
    withTable(asked, (table) => {
      const { rule, body } = asked;
      const elbow = measureEntry(body, 'elbow_rest_height');
      return question({
        ...aboveSeat(asked, [`Top of ${table.mark}`, fixed(table.topMm)], 'table over the seat'),
        lower: { pass: [elbow], further: allowance(-ruleNumber(rule, 'allowanceLower')) },
        upper: {
          pass: [
            elbow,
            ['forearm raised', ofBody(body, 'elbow_rest_height', ruleNumber(rule, 'elbowShare') - 1)],
            [
              'upper arm moved out',
              ofBody(body, 'acromial_height_sitting', ruleNumber(rule, 'shoulderShare')),
            ],
          ],
          further: allowance(ruleNumber(rule, 'allowanceUpper')),
        },
      });
    }),
  askPublic: (asked) =>
    withTable(asked, (table) =>
      question({
        ...aboveSeat(asked, [`Top of ${table.mark}`, fixed(table.topMm)], 'table over the seat'),
        ...publicSides(asked),
      }),
    ),
};

/** Both sides of a rule whose public lines are plain numbers. */
export const publicSides = ({ rule }: Asked): { lower: Side; upper: Side } => ({
  lower: fixedSide(ruleNumber(rule, 'publicPassLower'), ruleNumber(rule, 'publicFailLower')),
  upper: fixedSide(ruleNumber(rule, 'publicPassUpper'), ruleNumber(rule, 'publicFailUpper')),
});

/**
 * Belly room: back cushion to the table edge.
 *
 * @source rule TABLE-06
 */
export const bellyRoom: PersonCheck = {
  id: 'TABLE-06',
  ask: (asked) => bellyAnswer(asked, fixed(ruleNumber(asked.rule, 'passAllowance'))),
  askPublic: (asked) =>
    bellyAnswer(
      asked,
      minus(
        fixed(ruleNumber(asked.rule, 'publicPass')),
        ofBody(asked.body, 'abdominal_extension_depth_sitting'),
      ),
    ),
};

const bellyAnswer = (asked: Asked, passAllowance: Amount): Said =>
  withTable(asked, (table) => {
    const { place, rule, body } = asked;
    const entries: Entry[] = [
      ['back cushion to seat front', fixed(place.effectiveDepthMm)],
      [table.overlapMm < 0 ? 'gap to the table' : 'table over the seat', fixed(-table.overlapMm)],
    ];
    return question({
      value: fixed(place.effectiveDepthMm - table.overlapMm),
      setLedger: () => ledgerOf(entries, 'back to table edge'),
      lower: {
        pass: [measureEntry(body, 'abdominal_extension_depth_sitting'), ['room to move', passAllowance]],
        further: [['allowance for tight', minus(fixed(ruleNumber(rule, 'failAllowance')), passAllowance)]],
      },
    });
  });

/**
 * Knee depth: table edge to what is in the way at knee level.
 *
 * @source rule TABLE-03; a person's need is the buttock-knee length less the belly depth
 */
export const kneeDepth: PersonCheck = {
  id: 'TABLE-03',
  ask: (asked) =>
    depthAnswer(asked, 'knee', {
      pass: [
        measureEntry(asked.body, 'buttock_knee_length'),
        ['less the belly', ofBody(asked.body, 'abdominal_extension_depth_sitting', -1)],
      ],
    }),
  askPublic: (asked) =>
    depthAnswer(
      asked,
      'knee',
      fixedSide(ruleNumber(asked.rule, 'publicPass'), ruleNumber(asked.rule, 'publicFail')),
    ),
};

/**
 * Foot depth: table edge to what is in the way at the floor.
 *
 * @source rule TABLE-04
 */
export const footDepth: PersonCheck = {
  id: 'TABLE-04',
  ask: (asked) => depthAnswer(asked, 'foot', footSide(asked), stretchLedger(asked)),
  askPublic: (asked) => depthAnswer(asked, 'foot', footSide(asked)),
};

const footSide = ({ rule }: Asked): Side => fixedSide(ruleNumber(rule, 'pass'), ruleNumber(rule, 'fail'));

/** For information: how far before the table edge the legs end when stretched right out. */
const stretchLedger = (asked: Asked) => (): LedgerLine[] => {
  const { body, rule } = asked;
  const thigh = body.mean('buttock_popliteal_length');
  const shank = body.mean('popliteal_height') + body.person.shoeMm;
  const foot = body.mean('foot_length') + ruleNumber(rule, 'shoeLength');
  const stretch = fullLegStretchMm(thigh, shank, foot, best(pressedSeat(asked, 'front').height));
  if (stretch === undefined) return [];
  return ledgerOf(
    [
      measureEntry(body, 'buttock_popliteal_length'),
      ['shin stretched forward', fixed(stretch - thigh - foot)],
      ['foot in its shoe', fixed(foot)],
      ['less the belly', ofBody(body, 'abdominal_extension_depth_sitting', -1)],
    ],
    'legs stretched right out, from the table edge',
  );
};

function depthAnswer(
  asked: Asked,
  level: 'knee' | 'foot',
  lower: Side,
  before: () => LedgerLine[] = () => [],
): Said {
  const { table } = asked.place;
  if (!table) return NO_TABLE;
  const depthMm = level === 'knee' ? table.kneeDepthMm : table.footDepthMm;
  if (depthMm === undefined) {
    return { reason: `nothing in the way of the ${level === 'knee' ? 'knees' : 'feet'}` };
  }
  return [
    answerOf(
      table,
      question({
        value: fixed(depthMm),
        setLedger: () => [
          ...before(),
          ...ledgerOf([[`edge of ${table.mark} to the obstruction`, fixed(depthMm)]], `${level} depth`),
        ],
        lower,
      }),
    ),
  ];
}

/**
 * Space that fully stretched legs take, from the back of the seat.
 *
 * @param buttockPoplitealMm - back to crook of the knee; finite, > 0
 * @param poplitealShodMm - crook of the knee to the floor, shoe on; finite, > 0
 * @param footShodMm - length of the shoe; finite, > 0
 * @param seatHeightMm - pressed seat; finite, > 0
 * @returns millimetres, or `undefined` when the feet do not reach the floor
 * @source Pheasant, Bodyspace, eq. 4.1 (its form from memory; it gives the two printed results)
 */
export function fullLegStretchMm(
  buttockPoplitealMm: number,
  poplitealShodMm: number,
  footShodMm: number,
  seatHeightMm: number,
): number | undefined {
  if (poplitealShodMm < seatHeightMm) return undefined;
  return buttockPoplitealMm + Math.sqrt(poplitealShodMm ** 2 - seatHeightMm ** 2) + footShodMm;
}
