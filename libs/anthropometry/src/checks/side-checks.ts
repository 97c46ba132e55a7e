import { fixed, minus, moved, ofBody, plus, times } from './amount.ts';
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
import { allowance, ledgerOf, question, type Entry, type Side } from './question.ts';
import { ruleNumber, type Rule } from './rule-book.ts';
import type { SillSituation } from './situation.ts';
import { publicSides } from './table-checks.ts';
import type { Question } from './verdict.ts';

const BEHIND = 'the sill is behind the back';

/** Asks once for each sill beside the place. */
export function besideSills(asked: Asked, ask: (sill: SillSituation) => Question): Said {
  const { sills } = asked.place;
  if (sills.length === 0) return { reason: 'no sill' };
  const answers: Answer[] = [];
  for (const sill of sills) {
    if (sill.side === 'behind') continue;
    const { pieceId, mark, side } = sill;
    answers.push({ question: ask(sill), pieces: [{ pieceId, mark }], side });
  }
  return answers.length > 0 ? answers : { reason: BEHIND };
}

const overSeat = (asked: Asked, sill: SillSituation) => {
  const { height, ledger } = pressedSeat(asked, 'hip');
  const entries: Entry[] = [
    [`Top of ${sill.mark}`, fixed(sill.topMm)],
    ['less the seat', times(height, -1)],
  ];
  return {
    value: minus(fixed(sill.topMm), height),
    setLedger: () => [...ledger(), ...ledgerOf(entries, 'sill over the seat')],
  };
};

/**
 * Elbow to sill: the sill over the pressed seat against the resting elbow. A sill behind the back is only told:
 * the shoulder's height over it.
 *
 * @source rules SILL-01 (a person) and SILL-02 (the public)
 */
export const elbowToSill: PersonCheck = {
  id: 'SILL-01',
  ask(asked) {
    const said = besideSills(asked, (sill) => {
      const pass = ruleNumber(asked.rule, 'pass');
      const beyond = ruleNumber(asked.rule, 'fail') - pass;
      const elbow = measureEntry(asked.body, 'elbow_rest_height');
      return question({
        ...overSeat(asked, sill),
        lower: { pass: [elbow, ['leaning a little', fixed(-pass)]], further: allowance(-beyond) },
        upper: { pass: [elbow, ['shoulder lifted a little', fixed(pass)]], further: allowance(beyond) },
      });
    });
    const behind = asked.place.sills.find(({ side }) => side === 'behind');
    return 'reason' in said && behind ? shoulderOver(asked, behind) : said;
  },
  askPublic: (asked) =>
    besideSills(asked, (sill) => question({ ...overSeat(asked, sill), ...publicSides(asked) })),
};

function shoulderOver(asked: Asked, sill: SillSituation): Said {
  const { height } = pressedSeat(asked, 'hip');
  const over = moved(plus(height, ofBody(asked.body, 'acromial_height_sitting')), -sill.topMm);
  return { information: { value: over, words: `shoulder over ${sill.mark}, the sill behind` } };
}

/**
 * Reach to sill: sideways from the centre of the seat.
 *
 * @source rule SILL-04
 */
export const sillReach: PersonCheck = {
  id: 'SILL-04',
  ask: (asked) =>
    besideSills(asked, (sill) => {
      const { body, rule } = asked;
      return question({
        value: fixed(sill.centreToEdgeMm),
        setLedger: () =>
          ledgerOf(
            [[`seat centre to the edge of ${sill.mark}`, fixed(sill.centreToEdgeMm)]],
            'sideways to the sill',
          ),
        lower: {
          pass: [
            measureEntry(body, 'hip_breadth_sitting', 0.5),
            ['half the clothing', fixed(clothingOf(asked) / 2)],
          ],
        },
        upper: {
          pass: [measureEntry(body, 'forearm_forearm_breadth', 0.5)],
          further: [['elbow lifted outwards', fixed(ruleNumber(rule, 'failBeyond'))]],
        },
      });
    }),
  askPublic: () => ({ reason: 'asked of a named sitter only' }),
};

/**
 * Headroom: pressed seat to what hangs above.
 *
 * @source rules HEAD-02 (a person) and HEAD-01 (the public)
 */
export const headroom: PersonCheck = {
  id: 'HEAD-02',
  ask: (asked) => headAnswer(asked, [['room to move', 'allowance']]),
  askPublic: (asked) =>
    headAnswer(asked, [
      ['hat', 'hat'],
      ['room to move', 'allowance'],
    ]),
};

function headAnswer(asked: Asked, extras: [label: string, number: string][]): Said {
  const { overhead } = asked.place;
  if (!overhead) return { reason: 'nothing overhead' };
  const { height, ledger } = pressedSeat(asked, 'hip');
  const more = extras.map(([label, name]): Entry => [label, fixed(ruleNumber(asked.rule, name))]);
  const total = extras.reduce((sum, [, name]) => sum + ruleNumber(asked.rule, name), 0);
  return [
    {
      question: question({
        value: minus(fixed(overhead.undersideMm), height),
        setLedger: () => [
          ...ledger(),
          ...ledgerOf(
            [
              [`Underside of ${overhead.mark}`, fixed(overhead.undersideMm)],
              ['less the seat', times(height, -1)],
            ],
            'room over the seat',
          ),
        ],
        lower: { pass: [measureEntry(asked.body, 'sitting_height'), ...more], further: allowance(-total) },
      }),
      pieces: [{ pieceId: overhead.pieceId, mark: overhead.mark }],
    },
  ];
}

/**
 * Standing up: what hangs over the floor before the seat. A person's own line is stature, shoe and room to move; the
 * public is read against the height of a passage.
 *
 * @source rule HEAD-03
 */
export const standingUp: PersonCheck = {
  id: 'HEAD-03',
  ask: (asked) =>
    standingAnswer(asked, {
      pass: [measureEntry(asked.body, 'stature'), shoeEntry(asked), roomEntry(asked.rule)],
    }),
  askPublic(asked) {
    const { rule, model } = asked;
    const tall = model.percentile('men', 'stature', ruleNumber(rule, 'largePercentile'));
    return standingAnswer(asked, {
      pass: [['height of a passage', fixed(ruleNumber(rule, 'pass'))]],
      fail: [['Stature', fixed(tall)], ['shoe', fixed(ruleNumber(rule, 'shoe'))], roomEntry(rule)],
    });
  },
};

function standingAnswer({ place }: Asked, lower: Side): Said {
  const { overheadAhead } = place;
  if (!overheadAhead) return { reason: 'nothing overhead before the seat' };
  const { pieceId, mark, undersideMm } = overheadAhead;
  return [
    {
      question: question({
        value: fixed(undersideMm),
        setLedger: () => ledgerOf([[`Underside of ${mark}`, fixed(undersideMm)]], 'room over the floor'),
        lower,
      }),
      pieces: [{ pieceId, mark }],
    },
  ];
}

/**
 * Elbow to wall: seat centre to a wall beside it.
 *
 * @source rule SIDE-03
 */
export const elbowToWall: PersonCheck = {
  id: 'SIDE-03',
  ask: (asked) =>
    besideWalls(asked, {
      pass: [measureEntry(asked.body, 'forearm_forearm_breadth', 0.5), roomEntry(asked.rule)],
      fail: [measureEntry(asked.body, 'bideltoid_breadth', 0.5), roomEntry(asked.rule)],
    }),
  askPublic(asked) {
    const { rule, model } = asked;
    const large = ruleNumber(rule, 'largePercentile');
    const half = (key: 'forearm_forearm_breadth' | 'bideltoid_breadth') =>
      fixed(model.percentile('men', key, large) / 2);
    return besideWalls(asked, {
      pass: [['Half the elbow to elbow', half('forearm_forearm_breadth')], roomEntry(rule)],
      fail: [['Half the shoulder width', half('bideltoid_breadth')], roomEntry(rule)],
    });
  },
};

const roomEntry = (rule: Rule): Entry => ['room to move', fixed(ruleNumber(rule, 'allowance'))];

function besideWalls(asked: Asked, lower: Side): Said {
  const answers: Answer[] = [];
  for (const side of ['left', 'right'] as const) {
    const wallMm = asked.place.wallMm[side];
    if (wallMm === undefined) continue;
    answers.push({
      question: question({
        value: fixed(wallMm),
        setLedger: () => ledgerOf([[`seat centre to the wall, ${side} hand`, fixed(wallMm)]], 'elbow room'),
        lower,
      }),
      side,
    });
  }
  return answers.length > 0 ? answers : { reason: 'no wall' };
}
