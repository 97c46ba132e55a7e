import { fixed, minus, ofBody, times, type Amount } from './amount.ts';
import {
  clothingOf,
  measureEntry,
  pressedSeat,
  shoeEntry,
  type Asked,
  type PersonCheck,
  type Said,
} from './person-check.ts';
import { allowance, fixedSide, ledgerOf, question, type Entry, type Side } from './question.ts';
import { ruleNumber } from './rule-book.ts';
import type { Question } from './verdict.ts';
import { withTable } from './with-table.ts';

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
