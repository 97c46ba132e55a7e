import type { PartDifference, StandInCheck } from '@settlewright/anthropometry';
import { ApiProperty, ApiPropertyOptional, PickType } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import { IsInt, IsObject, IsString, IsUUID, MaxLength, Min, ValidateNested } from 'class-validator';
import { MayBeLeftOut } from '../../common/may-be-left-out';
import { CreateCastMemberDto } from '../../cast/dto/save-cast-member.dto';
import { ChoiceAnswerDto } from './choice-answer.dto';

const PLACE_MAX = 120;

/** Somebody who is not of the cast; kept nowhere. */
export class StrangerDto extends PickType(CreateCastMemberDto, [
  'bodyData',
  'statureMm',
  'statureSource',
  'weightKg',
  'age',
  'measured',
  'shoeMm',
  'clothing',
] as const) {}

export class AskStandInDto {
  @ApiProperty({ description: '`pieceId:place` where a cast member sits' })
  @IsString()
  @MaxLength(PLACE_MAX)
  placeId: string;

  @ApiPropertyOptional({
    format: 'uuid',
    description: 'a cast member who tries the seat; either this or `person`',
  })
  @MayBeLeftOut()
  @IsUUID()
  castId?: string;

  @ApiPropertyOptional({ type: StrangerDto, description: 'somebody else who tries it; a stature is needed' })
  @MayBeLeftOut()
  @IsObject()
  @ValidateNested()
  @Type(() => StrangerDto)
  person?: StrangerDto;

  @ApiPropertyOptional({ minimum: 1, description: 'for a draft: the one that was seen; any when absent' })
  @MayBeLeftOut()
  @IsInt()
  @Min(1)
  draftNumber?: number;
}

export class SpreadDto {
  @ApiProperty()
  best: number;
  @ApiProperty()
  low: number;
  @ApiProperty({ description: 'with `low` the range that holds 90 in 100' })
  high: number;
}

export class PartDifferenceDto extends SpreadDto implements PartDifference {
  @ApiProperty({ type: String })
  key: PartDifference['key'];
}

export class RoomsDto {
  @ApiProperty()
  castMember: number;
  @ApiProperty()
  standIn: number;
}

export class TakeDto {
  @ApiProperty({ enum: ['castMember', 'standIn'] })
  of: 'castMember' | 'standIn';
  @ApiProperty({ type: String })
  key: PartDifference['key'];
}

/** What one sit is worth for one check, as the anthropometry library says it. Lengths in the rule’s unit. */
export class StandInCheckDto implements StandInCheck {
  @ApiProperty()
  ruleId: string;
  @ApiProperty({
    enum: ['carriesOver', 'withDifference', 'cannotTell', 'notAsked'],
    description: '`cannotTell`: the sit cannot answer this check',
  })
  answer: StandInCheck['answer'];
  @ApiPropertyOptional({ description: 'why it is not asked' })
  reason?: string;
  @ApiProperty({ type: [PartDifferenceDto], description: 'stand-in less cast member' })
  parts: PartDifferenceDto[];
  @ApiPropertyOptional({
    type: SpreadDto,
    description: 'added to the room that the stand-in has, gives that of the cast member',
  })
  difference?: SpreadDto;
  @ApiPropertyOptional({ type: RoomsDto, description: 'room to the nearest fail line by the drawing' })
  room?: RoomsDto;
  @ApiPropertyOptional({
    enum: ['bodies', 'room'],
    description:
      'what an answer that carries over rests on: bodies alike in what is read, or only that both have room, or neither',
  })
  because?: 'bodies' | 'room';
  @ApiProperty({
    description: 'the bodies differ by more than `littleSaidMm`: whatever the answer, the sit says little',
  })
  saysLittle: boolean;
  @ApiProperty({ description: 'the sit by itself would show the wrong thing' })
  misleads: boolean;
  @ApiProperty({ enum: ['lessRoom', 'moreRoom', 'same', 'notKnown'] })
  side: StandInCheck['side'];
  @ApiPropertyOptional({ type: TakeDto, description: 'measurement that narrows the difference most' })
  take?: TakeDto;
}

export class StandInDto extends ChoiceAnswerDto {
  @ApiProperty()
  placeId: string;
  @ApiProperty({ format: 'uuid' })
  castId: string;
  @ApiProperty({ type: [StandInCheckDto] })
  checks: StandInCheckDto[];
  @ApiProperty({ description: 'difference of two bodies beyond which a sit says little' })
  littleSaidMm: number;
  @ApiProperty()
  confidence: number;
}
