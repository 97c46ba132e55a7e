import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common';
import { ApiConflictResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { AskStandInDto, StandInDto } from './dto/stand-in.dto';
import { StandInsService } from './stand-ins.service';

/** The answers tell how two bodies differ, so that they are for who sees measures. */
@ApiTags('choices')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId')
@Access('owner', 'designer')
export class StandInsController {
  constructor(private readonly standIns: StandInsService) {}

  @Post('draft/stand-in')
  @HttpCode(200)
  @ApiOkResponse({ type: StandInDto })
  @ApiConflictResponse({ description: 'the draft moved on' })
  ofDraft(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() asked: AskStandInDto,
  ): Promise<StandInDto> {
    return this.standIns.of(member, { productionId, setId }, asked);
  }

  @Post('revisions/:letter/stand-in')
  @HttpCode(200)
  @ApiOkResponse({ type: StandInDto })
  ofRevision(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Param('letter') letter: string,
    @Body() asked: AskStandInDto,
  ): Promise<StandInDto> {
    return this.standIns.of(member, { productionId, setId, letter }, asked);
  }
}
