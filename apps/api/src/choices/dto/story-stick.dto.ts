import type { Dimension } from '@settlewright/geometry';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { CrowdTold, ValueShare } from '../crowd-shares.service';
import type { ShownRow, ShownStick } from '../shown-stick';
import { ChoiceAnswerDto } from './choice-answer.dto';

const STATES = ['fits', 'tight', 'wontFit', 'notKnown', 'gone'];

export class DimensionDto implements Omit<Dimension, 'at'> {
  @ApiProperty()
  id: string;
  @ApiProperty()
  label: string;
  @ApiProperty({ enum: ['mm', 'deg', 'N'] })
  unit: Dimension['unit'];
  @ApiProperty({ type: [String], description: 'pieces that move' })
  pieceIds: string[];
  @ApiProperty({ type: [String] })
  marks: string[];
  @ApiProperty({ type: [String], description: 'tables that go up and down with the seats' })
  tableMarks: string[];
  @ApiProperty({ description: 'the present value' })
  value: number;
  @ApiProperty()
  min: number;
  @ApiProperty()
  max: number;
  @ApiProperty()
  ruleId: string;

  static of({
    id,
    label,
    unit,
    pieceIds,
    marks,
    tableMarks,
    value,
    min,
    max,
    ruleId,
  }: Dimension): DimensionDto {
    return { id, label, unit, pieceIds, marks, tableMarks, value, min, max, ruleId };
  }
}

export class StretchDto {
  @ApiProperty()
  from: number;
  @ApiProperty()
  to: number;
}

export class StickRowDto implements ShownRow {
  @ApiProperty()
  sitterId: string;
  @ApiProperty({ description: '`pieceId:place`' })
  placeId: string;
  @ApiProperty()
  name: string;
  @ApiProperty({ description: 'predicted or told, not measured' })
  estimated: boolean;
  @ApiProperty({
    type: [StretchDto],
    description:
      'where the sitter fits. `full`: by best values, ends where a line is crossed. `verdicts`: from one tried value to another',
  })
  fits: StretchDto[];
  @ApiProperty({ type: [StretchDto], description: 'where the sitter is at least tight; holds `fits`' })
  tight: StretchDto[];
  @ApiPropertyOptional({
    type: [StretchDto],
    description:
      'only with `full`: where each check keeps its fail line at the low end of its own 90 % range',
  })
  surelyTight?: StretchDto[];
  @ApiPropertyOptional({ type: [StretchDto], description: 'only with `full`: at the high end' })
  perhapsTight?: StretchDto[];
  @ApiProperty({ type: [String], enum: STATES, description: 'worst verdict at each tried value' })
  states: ShownRow['states'];
}

export class StickAnswerDto {
  @ApiProperty({ description: '`pieceId:place`' })
  placeId: string;
  @ApiProperty({ enum: STATES })
  state: ShownStick['atValue'][number]['state'];
}

export class StickClauseDto {
  @ApiProperty()
  ruleId: string;
  @ApiProperty()
  clause: string;
  @ApiProperty({ type: [String] })
  marks: string[];
  @ApiProperty({ type: [StretchDto] })
  inside: StretchDto[];
}

export class StickBandDto {
  @ApiProperty()
  name: string;
  @ApiProperty({ description: 'the sentence with its source' })
  words: string;
  @ApiProperty({ type: [StretchDto] })
  stretches: StretchDto[];
}

export class CrowdDto implements CrowdTold {
  @ApiProperty()
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty()
  source: string;
  @ApiProperty({ type: [String] })
  cautions: string[];
  @ApiPropertyOptional({ description: 'absent for a population of one sex' })
  womenPercent?: number;
  @ApiProperty()
  people: number;
  @ApiProperty({ type: [String], description: 'places that move; a person counts who fits at all of them' })
  placeIds: string[];
}

export class ValueShareDto implements ValueShare {
  @ApiProperty()
  value: number;
  @ApiPropertyOptional({
    description: '0 to 1; absent where a measure that is read is not known of the people',
  })
  fits?: number;
  @ApiPropertyOptional({ description: '0 to 1' })
  atLeastTight?: number;
}

export class StickSharesDto {
  @ApiProperty({ type: CrowdDto })
  population: CrowdDto;
  @ApiProperty({ type: [ValueShareDto], description: 'of the rules whose stretches are shown' })
  points: ValueShareDto[];
  @ApiProperty({ type: [ValueShareDto], description: 'of every rule of a person at once' })
  joint: ValueShareDto[];
}

/** Where each sitter fits along one number of a set, as far as its reader may see it. */
export class StoryStickDto extends ChoiceAnswerDto {
  @ApiProperty({
    enum: ['full', 'verdicts'],
    description:
      '`verdicts` for who sees no measures: values in the steps and the reach of shown margins, stretches by verdicts',
  })
  detail: ShownStick['detail'];
  @ApiProperty({ type: DimensionDto })
  dimension: DimensionDto;
  @ApiProperty({ description: 'step by which the number is chosen, in its unit' })
  step: number;
  @ApiProperty({ type: [Number], description: 'rising values that were tried' })
  values: number[];
  @ApiProperty({ description: 'rule whose stretches are shown, or `all`' })
  shownRule: string;
  @ApiProperty({ type: [String], description: 'rules of a person that the number moves' })
  ruleIds: string[];
  @ApiProperty({ type: [StickRowDto], description: 'highest stretch first' })
  rows: StickRowDto[];
  @ApiProperty({ type: [StretchDto] })
  allFit: StretchDto[];
  @ApiProperty({ type: [StretchDto] })
  allTight: StretchDto[];
  @ApiProperty({
    type: [StickClauseDto],
    description: 'code clauses that answer differently along the number',
  })
  clauses: StickClauseDto[];
  @ApiProperty({ type: [StickBandDto], description: 'what is usual, and what clauses ask, in words' })
  bands: StickBandDto[];
  @ApiProperty({ description: 'the value that is tried; the present one when none was asked for' })
  value: number;
  @ApiProperty({ type: [StickAnswerDto], description: 'worst verdict of each row at that value' })
  atValue: StickAnswerDto[];
  @ApiPropertyOptional({ type: StickSharesDto })
  shares?: StickSharesDto;
  @ApiProperty({ description: 'probability from which verdicts are given' })
  confidence: number;
}
