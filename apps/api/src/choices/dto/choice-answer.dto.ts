import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import type { ShownRule } from '../shown-rules';

export class VersionStateDto {
  @ApiPropertyOptional({ description: 'of a draft' })
  draftNumber?: number;
  @ApiPropertyOptional({ description: 'of an issued revision' })
  revisionLetter?: string;
}

export class RuleSourceDto {
  @ApiProperty()
  cite: string;
  @ApiProperty({ description: 'how it was read, as `read in the source` or `from memory`' })
  read: string;
}

export class ShownRuleDto implements ShownRule {
  @ApiProperty()
  id: string;
  @ApiProperty()
  name: string;
  @ApiProperty()
  why: string;
  @ApiProperty({ description: 'what its numbers rest on' })
  sourceWord: string;
  @ApiProperty({ type: [RuleSourceDto] })
  sources: RuleSourceDto[];
}

/** What every answer about one version says of itself. */
export class ChoiceAnswerDto {
  @ApiProperty({ type: VersionStateDto })
  version: VersionStateDto;
  @ApiProperty({ type: [ShownRuleDto] })
  rules: ShownRuleDto[];
  @ApiProperty()
  ruleVersion: string;
  @ApiProperty()
  caution: string;
}
