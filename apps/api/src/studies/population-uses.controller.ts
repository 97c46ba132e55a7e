import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiParam, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { PopulationUsesDto } from './dto/population-use.dto';
import { PopulationUses } from './population-uses.service';

/** What is to be said before a population is removed. */
@ApiTags('populations')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@Controller('workshops/:workshopId/populations/:populationId/studies')
export class PopulationUsesController {
  constructor(private readonly uses: PopulationUses) {}

  @Get()
  @Access('owner', 'designer')
  @ApiOkResponse({ type: PopulationUsesDto })
  async list(
    @Member() member: MemberInfo,
    @IdParam('populationId') populationId: string,
  ): Promise<PopulationUsesDto> {
    return { items: await this.uses.list(member, populationId) };
  }
}
