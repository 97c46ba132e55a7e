import { Injectable } from '@nestjs/common';
import type { MemberInfo } from '../common/access.decorator';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { CAUTION, type ConfidenceSince, confidenceSentence } from '../fit-checks/shown-sheet';
import { ProductionsService } from '../productions/productions.service';
import { WorkshopsService } from '../workshops/workshops.service';
import type { AskStickDto } from './dto/asked.dto';
import { DimensionDto, type StoryStickDto } from './dto/story-stick.dto';
import { EVERY_RULE } from './every-rule';
import { stickPdf } from './paper/stick-pdf';
import { shownRules } from './shown-rules';
import type { ShownStick } from './shown-stick';
import { StorySticks } from './story-sticks.service';
import { versionState } from './version-state';
import type { VersionPlace } from './versions.service';

/** Story sticks as answers and on paper. */
@Injectable()
export class StickPapers {
  constructor(
    private readonly sticks: StorySticks,
    private readonly fit: FitCheckService,
    private readonly productions: ProductionsService,
    private readonly workshops: WorkshopsService,
  ) {}

  async answer(member: MemberInfo, place: VersionPlace, asked: AskStickDto): Promise<StoryStickDto> {
    const { version, stick } = await this.sticks.of(member, place, asked);
    const { dimension, shares, ...shown } = stick;
    return {
      ...shown,
      version: versionState(version),
      dimension: DimensionDto.of(dimension),
      ...(shares ? { shares: { population: shares.told, points: shares.points, joint: shares.joint } } : {}),
      rules: this.rules(stick),
      caution: CAUTION,
    };
  }

  async pdf(
    member: MemberInfo,
    place: VersionPlace,
    asked: AskStickDto,
  ): Promise<{ name: string; content: Buffer }> {
    const { version, style, stick } = await this.sticks.of(member, place, asked);
    const production = await this.productions.forReading(member, place.productionId);
    const workshop = await this.workshops.get(member.workshopId);
    const { confidenceSetAt, timeZone } = workshop;
    const since: ConfidenceSince | null =
      version.state.kind === 'revision'
        ? { kind: 'issued', at: version.at }
        : confidenceSetAt && { kind: 'set', at: confidenceSetAt };
    const content = stickPdf({
      stick,
      rules: this.rules(stick),
      style,
      paper: workshop.paper,
      timeZone,
      workshop,
      productionName: production.name,
      setName: version.setName,
      state: version.state,
      at: version.at,
      by: version.by,
      confidence: confidenceSentence(stick, this.fit.ruleBook, since, timeZone),
    });
    return { name: `${version.setName} ${stick.dimension.label} story stick`, content };
  }

  private rules({ shownRule, ruleIds, clauses }: ShownStick) {
    const ofSitters = shownRule === EVERY_RULE ? ruleIds : [shownRule];
    return shownRules(this.fit.ruleBook, [...ofSitters, ...clauses.map(({ ruleId }) => ruleId)]);
  }
}
