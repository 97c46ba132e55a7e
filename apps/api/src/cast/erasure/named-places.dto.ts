import { ApiProperty } from '@nestjs/swagger';

/** A text in which a name stands, with what is around it. */
export class NamedPlaceDto {
  @ApiProperty({ description: 'where the text stands, in words' })
  where: string;
  @ApiProperty()
  before: string;
  @ApiProperty({ description: 'the name, or the part of it, as it was written' })
  name: string;
  @ApiProperty()
  after: string;
  @ApiProperty({ description: 'it went to the upholsterer or came from there' })
  alreadySent: boolean;
  @ApiProperty({ description: 'how often the same words stand there, as in earlier drafts' })
  copies: number;
}

export class NamedPlacesDto {
  @ApiProperty({
    type: [NamedPlaceDto],
    description: 'the whole name; taken out when the person is erased; the first 200',
  })
  places: NamedPlaceDto[];
  @ApiProperty()
  placeCount: number;
  @ApiProperty({
    type: [NamedPlaceDto],
    description: 'a part of the name by itself; stays, as it may be somebody else’s; the first 200',
  })
  parts: NamedPlaceDto[];
  @ApiProperty()
  partCount: number;
}
