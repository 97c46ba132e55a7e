import { fixed, moved, ofBody, plus, times } from './amount.ts';
import {
  clothingOf,
  measureEntry,
  pressedSeat,
  shoeEntry,
  type Asked,
  type PersonCheck,
  type Said,
} from './person-check.ts';
import { allowance, ledgerOf, question, type Entry, type Side } from './question.ts';
import { ruleNumber } from './rule-book.ts';

const RADIANS = Math.PI / 180;

/**
 * Seat height: the pressed front edge against the crook of the knee with shoes on.
 *
 * @source rules SEAT-02 (a person) and SEAT-01 (the public)
 */
export const seatHeight: PersonCheck = {
  id: 'SEAT-02',
  ask(asked) {
    const { height, ledger } = pressedSeat(asked, 'front');
    const leg: Entry[] = [measureEntry(asked.body, 'popliteal_height'), shoeEntry(asked)];
    const reach = moved(ofBody(asked.body, 'popliteal_height'), asked.body.person.shoeMm);
    const by = ruleNumber(asked.rule, 'allowance');
    const sloped = (name: 'level' | 'steep', sign: number): Side => {
      const degrees = ruleNumber(asked.rule, name);
      return {
        pass: [...leg, [`thigh sloping ${degrees}°`, times(reach, Math.cos(degrees * RADIANS) - 1)]],
        further: allowance(sign * by),
      };
    };
    return [
      {
        question: question({
          value: height,
          setLedger: ledger,
          lower: sloped('steep', -1),
          upper: sloped('level', 1),
        }),
      },
    ];
  },
  askPublic(asked) {
    const { height, ledger } = pressedSeat(asked, 'front');
    const { rule, model } = asked;
    const at = (percentile: 'small' | 'caution'): number =>
      model.percentile('women', 'popliteal_height', ruleNumber(rule, `${percentile}Percentile`));
    const small = at('small');
    return [
      {
        question: question({
          value: height,
          setLedger: ledger,
          upper: {
            pass: [
              ['Back of knee', fixed(small)],
              ['shoe', fixed(ruleNumber(rule, 'shoe'))],
            ],
            further: [['up to the middle woman', fixed(at('caution') - small)]],
          },
        }),
      },
    ];
  },
};

/**
 * Seat depth: back cushion to front edge against the length of the thigh.
 *
 * @source rules SEAT-04 (a person) and SEAT-03 (the public)
 */
export const seatDepth: PersonCheck = {
  id: 'SEAT-04',
  ask: (asked) => depthAnswer(asked, true),
  askPublic: (asked) => depthAnswer(asked, false),
};

function depthAnswer(asked: Asked, bothSides: boolean): Said {
  const { rule, body, place } = asked;
  const side = (name: 'Lower' | 'Upper', words: string): Side => {
    const share = ruleNumber(rule, `pass${name}Share`);
    const beyond = ruleNumber(rule, `fail${name}Share`) - share;
    return {
      pass: [
        measureEntry(body, 'buttock_popliteal_length'),
        [words, ofBody(body, 'buttock_popliteal_length', share - 1)],
      ],
      further: [['allowance for tight', ofBody(body, 'buttock_popliteal_length', beyond)]],
    };
  };
  return [
    {
      question: question({
        value: fixed(place.effectiveDepthMm),
        setLedger: () =>
          ledgerOf([['back cushion to seat front', fixed(place.effectiveDepthMm)]], 'seat depth'),
        lower: bothSides ? side('Lower', 'thigh that may stand out') : undefined,
        upper: side('Upper', 'gap behind the knee'),
      }),
    },
  ];
}

/**
 * Hip width: the width of the place against hips in clothes.
 *
 * @source rule SEAT-05
 */
export const hipWidth: PersonCheck = {
  id: 'SEAT-05',
  ask(asked) {
    const clothing = clothingOf(asked);
    return [
      {
        question: question({
          value: fixed(asked.place.widthMm),
          setLedger: () => ledgerOf([['width of the place', fixed(asked.place.widthMm)]], 'place'),
          lower: {
            pass: [measureEntry(asked.body, 'hip_breadth_sitting'), ['clothing', fixed(clothing)]],
            further: [['allowance for tight', fixed(-clothing)]],
          },
        }),
      },
    ];
  },
};

/**
 * Back height: top of the back over the pressed seat against the shoulder.
 *
 * @source rule BACK-03
 */
export const backHeight: PersonCheck = {
  id: 'BACK-03',
  ask(asked) {
    const share = ruleNumber(asked.rule, 'shoulderShare');
    return backAnswer(asked, [
      measureEntry(asked.body, 'acromial_height_sitting'),
      ['down to the shoulder blades', ofBody(asked.body, 'acromial_height_sitting', share - 1)],
    ]);
  },
  askPublic(asked) {
    const shoulder = ruleNumber(asked.rule, 'publicShoulder');
    const share = ruleNumber(asked.rule, 'shoulderShare');
    return backAnswer(asked, [
      ['Shoulder height', fixed(shoulder)],
      ['down to the shoulder blades', fixed((share - 1) * shoulder)],
    ]);
  },
};

function backAnswer(asked: Asked, pass: Entry[]): Said {
  const { backTopMm } = asked.place;
  if (backTopMm === undefined) return { reason: 'no back' };
  const { height, ledger } = pressedSeat(asked, 'hip');
  const fail = ruleNumber(asked.rule, 'fail');
  return [
    {
      question: question({
        value: plus(fixed(backTopMm), height, -1),
        setLedger: () => [
          ...ledger(),
          ...ledgerOf(
            [
              [`Top of the back of ${asked.place.mark}`, fixed(backTopMm)],
              ['less the seat', times(height, -1)],
            ],
            'back over the seat',
          ),
        ],
        lower: { pass, fail: [['set by the rule', fixed(fail)]] },
      }),
    },
  ];
}
