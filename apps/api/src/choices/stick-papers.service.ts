import { Injectable } from '@nestjs/common';
import type { MemberInfo } from '../common/access.decorator';
import { FitCheckService } from '../fit-checks/fit-check.service';
import { type ConfidenceSince, confidenceSentence } from '../fit-checks/shown-sheet';
import { WorkshopsService } from '../workshops/workshops.service';
import { answerFields } from './answer-fields';
import type { AskStickDto } from './dto/asked.dto';
import { DimensionDto, type StoryStickDto } from './dto/story-stick.dto';
import { EVERY_RULE } from './every-rule';
import { stickPdf } from './paper/stick-pdf';
import type { ShownStick } from './shown-stick';
import { StorySticks } from './story-sticks.service';
import type { Version, VersionPlace } from './versions.service';

/** Story sticks as answers and on paper. */
@Injectable()
export class StickPapers {
  constructor(
    private readonly sticks: StorySticks,
    private readonly fit: FitCheckService,
    private readonly workshops: WorkshopsService,
  ) {}

  async answer(member: MemberInfo, place: VersionPlace, asked: AskStickDto): Promise<StoryStickDto> {
    const { version, stick } = await this.sticks.of(member, place, asked);
    const { dimension, shares, ...shown } = stick;
    return {
      ...shown,
      ...this.fields(version, stick),
      dimension: DimensionDto.of(dimension),
      ...(shares ? { shares: { population: shares.told, points: shares.points, joint: shares.joint } } : {}),
    };
  }

  async pdf(
    member: MemberInfo,
    place: VersionPlace,
    asked: AskStickDto,
  ): Promise<{ name: string; content: Buffer }> {
    const { version, production, style, stick } = await this.sticks.of(member, place, asked);
    const workshop = await this.workshops.get(member.workshopId);
    const { confidenceSetAt, timeZone } = workshop;
    const since: ConfidenceSince | null =
      version.state.kind === 'revision'
        ? { kind: 'issued', at: version.at }
        : confidenceSetAt && { kind: 'set', at: confidenceSetAt };
    const fields = this.fields(version, stick);
    const content = stickPdf({
      stick,
      rules: fields.rules,
      style,
      paper: workshop.paper,
      timeZone,
      workshop,
      productionName: production.name,
      setName: version.setName,
      state: version.state,
      at: version.at,
      by: version.by,
      confidence: confidenceSentence(fields, this.fit.ruleBook, since, timeZone),
    });
    return { name: `${version.setName} ${stick.dimension.label} story stick`, content };
  }

  private fields(version: Version, { shownRule, ruleIds, clauses }: ShownStick) {
    const ofSitters = shownRule === EVERY_RULE ? ruleIds : [shownRule];
    const told = [...ofSitters, ...clauses.map(({ ruleId }) => ruleId)];
    return answerFields(version, this.fit.ruleBook, told);
  }
}
