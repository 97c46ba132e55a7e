import type { NextMeasureKey } from '@settlewright/anthropometry';
import { TAPE_MEASURE_KEYS } from '@settlewright/anthropometry';
import { ApiProperty } from '@nestjs/swagger';

/** A measurement, and what it would settle. */
export class NextMeasureDto {
  @ApiProperty({ enum: ['stature', 'weight_kg', ...TAPE_MEASURE_KEYS] })
  key: NextMeasureKey;
  @ApiProperty({ description: 'how many of the uncertain verdicts it settles on average' })
  settles: number;
  @ApiProperty({ type: [String], description: 'rules whose verdict it settles more often than not' })
  ruleIds: string[];
}

/** What to measure next of one person. */
export class PersonNextDto {
  @ApiProperty({ format: 'uuid' })
  castId: string;
  @ApiProperty({ type: [String], description: 'names of the sets that were looked at' })
  sets: string[];
  @ApiProperty({ description: 'verdicts that are not as sure as the workshop asks' })
  uncertain: number;
  @ApiProperty({ type: [NextMeasureDto], description: 'in the order to take them; at most two for one set' })
  order: NextMeasureDto[];
}

export class MeasureNextDto {
  @ApiProperty({ type: [PersonNextDto], description: 'one entry for everybody of the cast who sits' })
  items: PersonNextDto[];
  @ApiProperty({
    description:
      'taken places that were not looked at, as there are too many for one answer; ask again for more',
  })
  leftOut: number;
}
