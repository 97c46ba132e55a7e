import { fixed, ofBody } from '../checks/amount.ts';
import type { Asked, PersonCheck, Said } from '../checks/person-check.ts';
import type { Body } from '../people/body.ts';
import type { BodyModel } from '../people/body-model.ts';
import type { KnownPerson } from '../people/person.ts';

/** What people wear in a study. */
export type Wear = Pick<KnownPerson, 'shoeMm' | 'clothing'>;

/** Stand-ins that carry no values, only names. */
export interface Symbols {
  body: Body;
  /** Its `weight_kg` stands for the millimetres that the cushion goes down under the person. */
  sinkBody: Body;
}

/**
 * Symbols for people who wear the same.
 *
 * @param wear - shoe and clothes
 * @returns bodies of which only the wear can be read; reading a value throws
 */
export function createSymbols(wear: Wear): Symbols {
  const person: KnownPerson = { bodyData: 'mixed', measured: {}, ...wear };
  const symbol = (): Body =>
    new Proxy({} as Body, { get: (_, name) => (name === 'person' ? person : refuse()) });
  return { body: symbol(), sinkBody: symbol() };
}

const refuse = (): never => {
  throw new Error('A rule reads values of a body; accepted: amounts, so that it can be asked of many');
};
const NO_MODEL: BodyModel = { predict: refuse, mannequin: refuse, child: refuse, percentile: refuse };

/**
 * Asks a rule of a body without values.
 *
 * @param check - the rule of scope person
 * @param asked - its data, what the set offers, the symbols, and the lens where a camera is asked about
 * @returns the answer, made of amounts of the two symbols
 * @throws Error when the answer hangs on values of the body
 */
export function askSymbols(
  check: PersonCheck,
  asked: Pick<Asked, 'rule' | 'place' | 'lensHeightMm'> & { symbols: Symbols },
): Said {
  const { place, symbols } = asked;
  const sinks = place.foam !== undefined && place.foam.thicknessMm > 0;
  return check.ask({
    rule: asked.rule,
    place,
    lensHeightMm: asked.lensHeightMm,
    name: 'the sitter',
    body: symbols.body,
    sink: { amount: sinks ? ofBody(symbols.sinkBody, 'weight_kg') : fixed(0), bottomsOut: false },
    model: NO_MODEL,
  });
}
