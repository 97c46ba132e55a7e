import { best, fixed, ofBody } from './amount.ts';
import type { LedgerLine } from './fit-sheet.ts';
import { measureEntry, pressedSeat, type Asked, type PersonCheck, type Said } from './person-check.ts';
import { fixedSide, ledgerOf, question, type Side } from './question.ts';
import { ruleNumber } from './rule-book.ts';
import { answerOf, NO_TABLE } from './with-table.ts';

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
