import type { PopulationKind, ShareOutcome } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { seesMeasures } from '../../cast/sees-measures';
import type { MemberInfo } from '../../common/access.decorator';
import { DocumentJobDto, documentJobFields } from '../../jobs/dto/document-job.dto';
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

export class ListedStudyDto extends DocumentJobDto {
  @ApiProperty({ type: StudyProgressDto })
  progress: StudyProgressDto;
  @ApiProperty({ type: ToldPopulationDto })
  population: ToldPopulationDto;
  @ApiProperty()
  people: number;
  @ApiProperty()
  seed: number;
  @ApiPropertyOptional({ type: [String], description: 'absent: all' })
  ruleIds?: string[];
  @ApiPropertyOptional({ type: [String], description: 'absent: all' })
  placeIds?: string[];
  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: true,
    description: 'ShareOutcome of the anthropometry library: all ticked rules at all ticked places',
  })
  outcome?: ShareOutcome;

  static of(study: Study): ListedStudyDto {
    const { blocks, blocksDone, population, people, seed, ruleIds, placeIds, outcome } = study;
    return {
      ...documentJobFields(study),
      progress: { blocks, done: blocksDone },
      population,
      people,
      seed,
      ...(ruleIds ? { ruleIds } : {}),
      ...(placeIds ? { placeIds } : {}),
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
