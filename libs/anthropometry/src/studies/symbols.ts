import { fixed, ofBody } from '../checks/amount.ts';
import type { Asked, PersonCheck, Said } from '../checks/person-check.ts';
import type { Rule } from '../checks/rule-book.ts';
import type { PlaceSituation } from '../checks/situation.ts';
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
 * Asks a rule of a body without values.
 *
 * @param check - the rule of scope person
 * @param rule - its data
 * @param place - what the set offers
 * @param wear - shoe and clothes
 * @param lensHeightMm - lens over the floor; left out where no camera is asked about
 * @returns the answer, made of amounts of the two symbols
 * @throws Error when the answer hangs on values of the body
 */
export function askSymbols(
  check: PersonCheck,
  rule: Rule,
  place: PlaceSituation,
  wear: Wear,
  lensHeightMm?: number,
): { said: Said; symbols: Symbols } {
  const refuse = (): never => {
    throw new Error(`${rule.id} reads values of a body; accepted: amounts, so that it can be asked of many`);
  };
  const person: KnownPerson = { bodyData: 'mixed', measured: {}, ...wear };
  const symbol = (): Body =>
    new Proxy({} as Body, { get: (_, name) => (name === 'person' ? person : refuse()) });
  const model: BodyModel = { predict: refuse, mannequin: refuse, percentile: refuse };
  const symbols: Symbols = { body: symbol(), sinkBody: symbol() };
  const sinks = place.foam !== undefined && place.foam.thicknessMm > 0;
  const asked: Asked = {
    rule,
    place,
    name: 'the sitter',
    body: symbols.body,
    sink: { amount: sinks ? ofBody(symbols.sinkBody, 'weight_kg') : fixed(0), bottomsOut: false },
    model,
    lensHeightMm,
  };
  return { said: check.ask(asked), symbols };
}
