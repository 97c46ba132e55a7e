import { setImmediate } from 'node:timers/promises';
import {
  type BodyModel,
  checkSet,
  type CheckSettings,
  checkSitter,
  createBodyModel,
  type FitSheet,
  type KnownPerson,
  loadRuleBook,
  type NextMeasures,
  nextMeasures,
  type RuleBook,
  type Sitter,
  standIn,
  type StandInCheck,
} from '@settlewright/anthropometry';
import { measureSet, type SetDocument, type SitterRef } from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import type { CastPerson } from '../cast/known-person';
import { readSeedData } from '../common/seed-data';
import { digest, RecentAnswers } from './recent-answers';
import { type RoundedBody, roundedBody } from './rounded-body';

const ORDINALS = new Intl.PluralRules('en', { type: 'ordinal' });
const ENDINGS: Partial<Record<Intl.LDMLPluralRule, string>> = { one: 'st', two: 'nd', few: 'rd' };
const ONE: Record<'women' | 'men', string> = { women: 'Woman', men: 'Man' };

/** Which measurements settle most of what is not known of somebody at a place. */
export interface SitterNext {
  castId: string;
  placeId: string;
  next: NextMeasures;
}

/** How many people may be worked out anew for one request, and who was not for want of turns, once for each place. */
export interface Turns {
  left: number;
  leftOut: string[];
}

const RECENT = 500;

/** What a set is checked for, and how sure its verdicts must be; null: as sure as the rule book asks. */
const settingsOf = ({ asked }: SetDocument, confidence: number | null): CheckSettings => ({
  ...asked,
  ...(confidence === null ? {} : { confidence }),
});

/** Makes fit sheets on the server, so that verdicts can be shown to people who may not see measures. */
@Injectable()
export class FitCheckService {
  readonly ruleBook: RuleBook = loadRuleBook(readSeedData('fit-rules'));
  private readonly model: BodyModel = createBodyModel(
    readSeedData('populations/ansur2'),
    readSeedData('populations/children'),
  );
  private readonly recent = new RecentAnswers<NextMeasures>(RECENT);

  /** `confidence` is what the workshop asks of a verdict; null: as much as the rule book does. */
  sheetFor(
    document: SetDocument,
    cast: readonly CastPerson[],
    confidence: number | null,
    { sittersOnly = false } = {},
  ): FitSheet {
    return checkSet({
      situation: measureSet(document, this.ruleBook),
      sitters: this.sitters(document, cast),
      ruleBook: this.ruleBook,
      model: this.model,
      settings: settingsOf(document, confidence),
      sittersOnly,
    });
  }

  /** How far the sit of one person at a place can be trusted for another, check by check. */
  standIn(
    { document, placeId, confidence }: { document: SetDocument; placeId: string; confidence: number | null },
    people: Record<'castMember' | 'standIn', KnownPerson>,
  ): StandInCheck[] | undefined {
    const place = measureSet(document).places.find((one) => one.placeId === placeId);
    return (
      place &&
      standIn({
        ...people,
        place,
        ruleBook: this.ruleBook,
        model: this.model,
        settings: settingsOf(document, confidence),
      })
    );
  }

  /**
   * What to measure next of everyone of the cast who sits in the document. Each person takes some tenths of a second,
   * so others get their turn between two of them, and what was worked out lately costs no turn.
   */
  async *measureNext(
    document: SetDocument,
    cast: readonly CastPerson[],
    confidence: number | null,
    turns: Turns,
  ): AsyncGenerator<SitterNext> {
    const { ruleBook, model } = this;
    const settings = settingsOf(document, confidence);
    const input = { situation: measureSet(document, ruleBook), ruleBook, model, settings };
    const asked = digest([document, confidence]);
    for (const sitter of this.sitters(document, cast)) {
      if (sitter.kind !== 'cast' || sitter.noBody) continue;
      const key = digest([asked, sitter.placeId, sitter.person]);
      let next = this.recent.get(key);
      if (!next) {
        if (turns.left === 0) {
          turns.leftOut.push(sitter.id);
          continue;
        }
        await setImmediate();
        // Somebody who asked for the same a moment ago may have worked it out meanwhile.
        next = this.recent.get(key);
      }
      if (!next) {
        turns.left -= 1;
        next = nextMeasures({
          person: sitter.person,
          model,
          rowFor: (person, ruleIds) => checkSitter(input, { ...sitter, person }, ruleIds),
          confidence: confidence ?? ruleBook.confidence,
        });
        this.recent.set(key, next);
      }
      yield { castId: sitter.id, placeId: sitter.placeId, next };
    }
  }

  /** A body for each taken place that has one, as far as everybody in the workshop may see it. */
  bodiesFor(document: SetDocument, cast: readonly CastPerson[]): RoundedBody[] {
    return this.sitters(document, cast)
      .filter(({ noBody }) => !noBody)
      .map(({ placeId, person }) => roundedBody(placeId, person, this.model.predict(person).means()));
  }

  /** Whoever sits at a place, with what is known of them. */
  sitters(document: SetDocument, cast: readonly CastPerson[]): Sitter[] {
    const people = new Map(cast.map((person) => [person.id, person]));
    return document.seating.flatMap(({ pieceId, place, sitter }): Sitter[] => {
      const placeId = `${pieceId}:${place}`;
      if (sitter.kind === 'cast') {
        const known = people.get(sitter.castId);
        return known ? [{ ...known, kind: 'cast', placeId }] : [];
      }
      const [name, person] =
        sitter.kind === 'child'
          ? [`Child, size mark ${sitter.sizeMark}`, this.model.child(sitter.sizeMark)]
          : [mannequinName(sitter), this.model.mannequin(sitter)];
      return [{ id: `mannequin:${placeId}`, name, kind: 'mannequin', placeId, person }];
    });
  }
}

/** "Woman, 5th in stature". */
function mannequinName({ bodyData, measure, percentile }: Extract<SitterRef, { kind: 'mannequin' }>): string {
  const ending = ENDINGS[ORDINALS.select(percentile)] ?? 'th';
  return `${ONE[bodyData]}, ${percentile}${ending} in ${measure.replaceAll('_', ' ')}`;
}
