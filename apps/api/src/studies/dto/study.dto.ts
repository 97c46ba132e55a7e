import type { PopulationKind, ShareOutcome } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { seesMeasures } from '../../cast/sees-measures';
import type { MemberInfo } from '../../common/access.decorator';
import { PersonDto } from '../../sets/dto/person.dto';
import { JOB_STATES, type JobState } from '../../jobs/job-states';
import type { Study } from '../entities/study.entity';
import type { StudyResult } from '../study-question';

export class ToldPopulationDto {
  @ApiProperty()
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty({ enum: ['survey', 'generated', 'estimated', 'own'] })
  kind: PopulationKind;
  @ApiProperty()
  source: string;
  @ApiProperty()
  licence: string;
  @ApiProperty({ type: [String], description: 'to be said wherever a share is shown' })
  cautions: string[];
}

export class StudyProgressDto {
  @ApiProperty({ description: 'parts that the people are split into' })
  blocks: number;
  @ApiProperty({ description: 'parts that are counted' })
  done: number;
}

export class ListedStudyDto {
  @ApiProperty({ format: 'uuid' })
  id: string;
  @ApiProperty({ enum: JOB_STATES })
  state: JobState;
  @ApiProperty({ type: StudyProgressDto })
  progress: StudyProgressDto;
  @ApiPropertyOptional({ description: 'of the document; either this or `revisionLetter`' })
  draftNumber?: number;
  @ApiPropertyOptional()
  revisionLetter?: string;
  @ApiProperty({ type: ToldPopulationDto })
  population: ToldPopulationDto;
  @ApiPropertyOptional({ description: 'women of 100 people; absent for a population of one sex' })
  womenPercent?: number;
  @ApiProperty()
  people: number;
  @ApiProperty()
  seed: number;
  @ApiPropertyOptional({ type: [String], description: 'absent: all' })
  ruleIds?: string[];
  @ApiPropertyOptional({ type: [String], description: 'absent: all' })
  placeIds?: string[];
  @ApiProperty()
  ruleVersion: string;
  @ApiProperty({ type: PersonDto })
  startedBy: PersonDto;
  @ApiProperty({ format: 'date-time' })
  startedAt: string;
  @ApiPropertyOptional({ format: 'date-time' })
  endedAt?: string;
  @ApiPropertyOptional({ description: 'why it failed' })
  fault?: string;
  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: true,
    description: 'ShareOutcome of the anthropometry library: all ticked rules at all ticked places',
  })
  outcome?: ShareOutcome;

  static of(study: Study): ListedStudyDto {
    const { id, state, draftNumber, revisionLetter, womenPercent, ruleIds, placeIds, fault, outcome } = study;
    const { population, people, seed, ruleVersion, endedAt } = study;
    return {
      id,
      state,
      progress: { blocks: study.blocks, done: study.blocksDone },
      ...(draftNumber === null ? {} : { draftNumber }),
      ...(revisionLetter === null ? {} : { revisionLetter }),
      population,
      ...(womenPercent === null ? {} : { womenPercent }),
      people,
      seed,
      ...(ruleIds ? { ruleIds } : {}),
      ...(placeIds ? { placeIds } : {}),
      ruleVersion,
      startedBy: PersonDto.of(study.startedById, study.startedBy),
      startedAt: study.startedAt.toISOString(),
      ...(endedAt ? { endedAt: endedAt.toISOString() } : {}),
      ...(fault === null ? {} : { fault }),
      ...(outcome ? { outcome } : {}),
    };
  }
}

export class StudyDto extends ListedStudyDto {
  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: true,
    description: 'StudyShares of the anthropometry library; when done',
  })
  result?: StudyResult | ResultWithoutTraits;

  static for(member: MemberInfo, study: Study): StudyDto {
    const { result } = study;
    if (!result) return ListedStudyDto.of(study);
    return {
      ...ListedStudyDto.of(study),
      result: seesMeasures(member) ? result : withoutTraits(result),
    };
  }
}

type Check = StudyResult['checks'][number];
type ResultWithoutTraits = Omit<StudyResult, 'checks'> & {
  checks: (Omit<Check, 'lost'> & { lost?: Omit<NonNullable<Check['lost']>, 'traits'> })[];
};

/** The shares stay; the body measures of those who do not fit, and of the rest, go. */
function withoutTraits(result: StudyResult): ResultWithoutTraits {
  return {
    ...result,
    checks: result.checks.map(({ lost, ...check }) => {
      if (!lost) return check;
      const { share, women, words } = lost;
      return { ...check, lost: { share, women, words } };
    }),
  };
}

export class StudyListDto {
  @ApiProperty({ type: [ListedStudyDto], description: 'the last 20, newest first' })
  items: ListedStudyDto[];
}
