import type { AnswerKind, CellState, Dimension } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { seesMeasures } from '../../cast/sees-measures';
import type { MemberInfo } from '../../common/access.decorator';
import { CELL_STATES } from '../../fit-checks/cell-states';
import { DocumentJobDto, documentJobFields } from '../../jobs/dto/document-job.dto';
import { ToldPopulationDto } from '../../studies/dto/study.dto';
import type { DimensionSearch } from '../entities/dimension-search.entity';
import type { KeptTried, ToldDimension, ToldSitter } from '../search-question';

export class FreeDimensionDto {
  @ApiProperty()
  dimensionId: string;
  @ApiProperty()
  label: string;
  @ApiProperty({ enum: ['mm', 'deg', 'N'], description: 'of every number of this dimension' })
  unit: Dimension['unit'];
  @ApiProperty({ type: [String], description: 'pieces that move' })
  marks: string[];
  @ApiProperty({ type: [String], description: 'tables that go up and down with the seats' })
  tableMarks: string[];
  @ApiProperty({ description: 'in the document that was asked about' })
  value: number;
  @ApiProperty()
  min: number;
  @ApiProperty()
  max: number;
  @ApiProperty({ description: 'rounding step' })
  step: number;
}

export class ServedDto {
  @ApiProperty({ description: 'of a cast member, or `mannequin:pieceId:place`' })
  sitterId: string;
  @ApiProperty()
  name: string;
}

export class SearchProgressDto {
  @ApiProperty({ description: 'choices tried' })
  done: number;
  @ApiProperty({ description: 'of at most so many; 0 until a worker begins' })
  of: number;
}

export class ListedSuggestionDto extends DocumentJobDto {
  @ApiProperty({ type: SearchProgressDto })
  progress: SearchProgressDto;
  @ApiProperty({ type: [FreeDimensionDto] })
  free: FreeDimensionDto[];
  @ApiProperty({ type: [ServedDto], description: 'who must be served' })
  served: ServedDto[];
  @ApiPropertyOptional({ type: ToldPopulationDto, description: 'of whom as many as can be are served then' })
  population?: ToldPopulationDto;

  static of(search: DimensionSearch, names: ReadonlyMap<string, string>): ListedSuggestionDto {
    const { done, most, free, served, population } = search;
    return {
      ...documentJobFields(search),
      progress: { done, of: most },
      free,
      served: served.map((one) => ({ sitterId: one.id, name: nameOf(one, names) })),
      ...(population ? { population } : {}),
    };
  }
}

const nameOf = (sitter: ToldSitter, names: ReadonlyMap<string, string>): string =>
  sitter.kind === 'cast' ? (names.get(sitter.id) ?? 'somebody') : sitter.name;

export class ChosenValueDto {
  @ApiProperty()
  dimensionId: string;
  @ApiProperty({ description: 'in the dimension’s unit' })
  value: number;
}

/** A check of somebody that is not at least tight. */
export class MissDto {
  @ApiProperty()
  sitterId: string;
  @ApiPropertyOptional({ description: 'absent where the place is gone altogether' })
  ruleId?: string;
  @ApiPropertyOptional({
    description:
      'missing to the fail line, in the rule’s unit; for owner and designer, until the person is erased',
  })
  byMm?: number;
  @ApiPropertyOptional({ description: 'answered in the set as it is, and no longer' })
  gone?: true;
}

/** One choice of all free dimensions. */
export class ChoiceDto {
  @ApiProperty({ type: [ChosenValueDto] })
  values: ChosenValueDto[];
  @ApiProperty({ type: [MissDto], description: 'none: everybody named is at least tight in every check' })
  misses: MissDto[];
  @ApiProperty({ description: 'checks that are tight' })
  tight: number;
  @ApiProperty({ description: 'checks about pieces and ways, and clauses, that turn worse' })
  worse: number;
  @ApiPropertyOptional({
    description: 'of the population at least tight in all of `counted` at once, 0 to 1',
  })
  share?: number;
  @ApiProperty({ description: 'sum of the moves, each against its range' })
  distance: number;
}

/** A check that an answer turns, against the set as it is. */
export class CheckChangeDto {
  @ApiProperty()
  ruleId: string;
  @ApiProperty({ enum: CELL_STATES })
  from: CellState;
  @ApiProperty({ enum: CELL_STATES })
  to: CellState;
}

export class SitterChangeDto {
  @ApiProperty()
  sitterId: string;
  @ApiProperty({ type: [CheckChangeDto] })
  gains: CheckChangeDto[];
  @ApiProperty({ type: [CheckChangeDto] })
  losses: CheckChangeDto[];
}

export class PieceChangeDto extends CheckChangeDto {
  @ApiProperty({ type: [String] })
  marks: string[];
}

export class PieceChangesDto {
  @ApiProperty({ type: [PieceChangeDto] })
  gains: PieceChangeDto[];
  @ApiProperty({ type: [PieceChangeDto] })
  losses: PieceChangeDto[];
}

export class AnswerDto extends ChoiceDto {
  @ApiProperty({
    enum: ['best', 'nearest', 'another'],
    description: 'the best; the one that moves least and misses no more; another good one far from both',
  })
  kind: AnswerKind;
  @ApiProperty({ type: [SitterChangeDto], description: 'whom it costs and whom it helps' })
  sitters: SitterChangeDto[];
  @ApiProperty({ type: PieceChangesDto })
  pieces: PieceChangesDto;
}

export class BlameDto {
  @ApiProperty({ enum: ['sitter', 'rule'] })
  kind: 'sitter' | 'rule';
  @ApiProperty({ description: 'of the sitter, or of the rule' })
  id: string;
  @ApiProperty({ description: 'misses that are left in the best answer without it' })
  left: number;
}

export class SuggestionDto extends ListedSuggestionDto {
  @ApiPropertyOptional({
    type: ChoiceDto,
    description: 'the set as it is; absent where the ranges leave it out',
  })
  present?: ChoiceDto;
  @ApiProperty({ type: [AnswerDto], description: 'found so far; up to three that differ' })
  answers: AnswerDto[];
  @ApiPropertyOptional({ description: 'when done: whether an answer serves everybody named' })
  servesAll?: boolean;
  @ApiPropertyOptional({
    type: BlameDto,
    description: 'when done and no answer serves all: the one sitter or rule that stands most in the way',
  })
  blame?: BlameDto;
  @ApiProperty({ type: [String], description: 'rules that the share counts at once' })
  counted: string[];
  @ApiProperty({
    type: [String],
    description: 'rules that the population cannot be told by: with one there is no share',
  })
  unknown: string[];
  @ApiProperty({ type: [String], description: 'rules that nobody was found to meet: no share counts them' })
  metByNobody: string[];

  static for(member: MemberInfo, search: DimensionSearch, names: ReadonlyMap<string, string>): SuggestionDto {
    const { found, free, state } = search;
    const { present, answers = [], blame, counted = [], unknown = [], metByNobody = [] } = found ?? {};
    const shown = (tried: KeptTried) => choice(tried, free, seesMeasures(member));
    return {
      ...ListedSuggestionDto.of(search, names),
      ...(present ? { present: shown(present) } : {}),
      answers: answers.map(({ kind, tried, sitters, pieces }) => ({
        kind,
        ...shown(tried),
        sitters,
        pieces,
      })),
      ...(state === 'done' ? { servesAll: answers[0]?.tried.misses.length === 0 } : {}),
      ...(blame ? { blame } : {}),
      counted,
      unknown,
      metByNobody,
    };
  }
}

function choice(tried: KeptTried, free: readonly ToldDimension[], withMeasures: boolean): ChoiceDto {
  const { values, misses, tight, worse, share, distance } = tried;
  return {
    values: free.map(({ dimensionId }, i) => ({ dimensionId, value: values[i] as number })),
    misses: misses.map(({ sitterId, ruleId, byMm, gone }) => ({
      sitterId,
      ...(ruleId === undefined ? {} : { ruleId }),
      ...(byMm === undefined || !withMeasures ? {} : { byMm }),
      ...(gone ? { gone } : {}),
    })),
    tight,
    worse,
    ...(share === undefined ? {} : { share }),
    distance,
  };
}

export class SuggestionListDto {
  @ApiProperty({ type: [ListedSuggestionDto], description: 'the last 20, newest first' })
  items: ListedSuggestionDto[];
}
