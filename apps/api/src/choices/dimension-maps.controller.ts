import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common';
import { ApiConflictResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { DimensionMaps } from './dimension-maps.service';
import { AskMapDto } from './dto/asked.dto';
import { DimensionMapDto } from './dto/dimension-map.dto';

@ApiTags('choices')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId')
@Access('owner', 'designer', 'carpenter', 'reviewer')
export class DimensionMapsController {
  constructor(private readonly maps: DimensionMaps) {}

  @Post('draft/dimension-map')
  @HttpCode(200)
  @ApiOkResponse({ type: DimensionMapDto })
  @ApiConflictResponse({ description: 'the draft moved on' })
  ofDraft(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() asked: AskMapDto,
  ): Promise<DimensionMapDto> {
    return this.maps.of(member, { productionId, setId }, asked);
  }

  @Post('revisions/:letter/dimension-map')
  @HttpCode(200)
  @ApiOkResponse({ type: DimensionMapDto })
  ofRevision(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Param('letter') letter: string,
    @Body() asked: AskMapDto,
  ): Promise<DimensionMapDto> {
    return this.maps.of(member, { productionId, setId, letter }, asked);
  }
}
