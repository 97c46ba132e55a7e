import type { FitSheet } from '@settlewright/anthropometry';
import {
  type Dimension,
  type LengthStyle,
  measuredPlaces,
  type SetDocument,
  stickBands,
  stickValues,
  storyStick,
} from '@settlewright/geometry';
import { Injectable } from '@nestjs/common';
import { seesMeasures } from '../cast/sees-measures';
import type { MemberInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { FitCheckService } from '../fit-checks/fit-check.service';
import type { Production } from '../productions/entities/production.entity';
import { ProductionsService } from '../productions/productions.service';
import { RateLimits } from '../rate-limits/rate-limits.service';
import { CrowdShares, type NamedCrowd } from './crowd-shares.service';
import type { AskStickDto } from './dto/asked.dto';
import { EVERY_RULE } from './every-rule';
import { coarseAnswers, fullAnswers, type ShownStick, stateAt } from './shown-stick';
import { COARSE, fine, type Fineness, readDimension, readValue } from './tried-dimension';
import { inTurns, refuseTooMuch } from './trying';
import { type Version, type VersionPlace, VersionsService } from './versions.service';

const MOST_CURVE_POINTS = 49;

/** Where each sitter fits along one number of a set, worked out by the functions that the browser uses. */
@Injectable()
export class StorySticks {
  constructor(
    private readonly versions: VersionsService,
    private readonly fit: FitCheckService,
    private readonly crowds: CrowdShares,
    private readonly productions: ProductionsService,
    private readonly limits: RateLimits,
  ) {}

  async of(
    member: MemberInfo,
    place: VersionPlace,
    asked: AskStickDto,
  ): Promise<{ version: Version; production: Production; style: LengthStyle; stick: ShownStick }> {
    const version = await this.versions.find(member, { ...place, draftNumber: asked.draftNumber });
    const production = await this.productions.forReading(member, place.productionId);
    const style: LengthStyle = {
      system: asked.units ?? production.units,
      roundTo: asked.roundTo ?? production.roundTo,
    };
    const fineness = seesMeasures(member) ? fine(style) : COARSE;
    const dimension = readDimension(version.document, asked);
    const rule = this.readRule(dimension, asked.ruleId);
    const value = readValue(dimension, asked.value, fineness);
    const crowd = await this.crowds.crowd(member, asked);
    // Code clauses and what is usual read nobody's body, and are looked at finely for everybody.
    const seen = fineness.stickValues(dimension);
    const values = [...new Set([...fine(style).stickValues(dimension), ...seen])].sort((a, b) => a - b);
    refuseTooMuch(version.document, values.length, 'dimension');
    await this.limits.take('tried-sets', member.userId);
    const stick = await this.stick(version, { dimension, values, seen, value, rule, fineness, style });
    if (!crowd) return { version, production, style, stick };
    const shares = await this.shares(version.document, crowd, { stick, style });
    return { version, production, style, stick: { ...stick, shares } };
  }

  /** A rule of a person; those about benches and tables have no stretch of a sitter. */
  private readRule({ ruleId }: Dimension, asked: string | undefined): string {
    const { ruleBook } = this.fit;
    const ofPerson = ruleBook.rules.filter(({ scope }) => scope === 'person').map(({ id }) => id);
    if (asked === undefined) return ofPerson.includes(ruleId) ? ruleId : EVERY_RULE;
    if (asked === EVERY_RULE || ofPerson.includes(asked)) return asked;
    const message = `no rule of one sitter has the id "${asked}"; accepted: ${[EVERY_RULE, ...ofPerson].join(', ')}`;
    throw Problem.invalid([{ path: 'ruleId', code: 'unknown', message }]);
  }

  private async stick(
    { document, people, confidence }: Version,
    asked: {
      dimension: Dimension;
      values: number[];
      seen: number[];
      value: number;
      rule: string;
      fineness: Fineness;
      style: LengthStyle;
    },
  ): Promise<ShownStick> {
    const { dimension, values, seen, value, rule, fineness, style } = asked;
    const check = (set: SetDocument): FitSheet =>
      this.fit.sheetFor(set, people, confidence, { sittersOnly: true });
    const ruleId = rule === EVERY_RULE ? {} : { ruleId: rule };
    const made = await inTurns(storyStick({ dimension, values, check, ...ruleId }));
    const { ruleIds, clauses } = made;
    const answers = fineness === COARSE ? coarseAnswers(made, seen) : fullAnswers(made);
    const set = dimension.at(value) ?? document;
    const sheet = check(set);
    const shown = new Set(rule === EVERY_RULE ? ruleIds : [rule]);
    return {
      detail: fineness === COARSE ? 'verdicts' : 'full',
      dimension,
      step: fineness.step(dimension),
      ...answers,
      shownRule: rule,
      ruleIds,
      clauses,
      bands: stickBands(made, this.fit.ruleBook, style),
      value,
      atValue: answers.rows.map(({ placeId }) => ({ placeId, state: stateAt(sheet, placeId, shown) })),
    };
  }

  /** A share says nothing of any one person, so that everybody sees it finely. */
  private async shares(
    document: SetDocument,
    crowd: NamedCrowd,
    { stick, style }: { stick: ShownStick; style: LengthStyle },
  ): Promise<NonNullable<ShownStick['shares']>> {
    const { dimension, shownRule, ruleIds } = stick;
    const all = stickValues(dimension, fine(style).step(dimension));
    const every = Math.ceil(all.length / MOST_CURVE_POINTS);
    const values = all.filter((_, n) => n % every === 0 || n === all.length - 1);
    const placesAt = await inTurns(measuredPlaces(values.map((value) => dimension.at(value))));
    const counted = shownRule === EVERY_RULE ? ruleIds : [shownRule];
    return this.crowds.along(crowd, document, { values, placesAt, ruleIds: counted });
  }
}
