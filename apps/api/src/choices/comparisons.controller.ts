import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { ComparisonsService } from './comparisons.service';
import { AskComparisonDto, ComparisonDto } from './dto/comparison.dto';

@ApiTags('choices')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId/comparison')
@Access('owner', 'designer', 'carpenter', 'reviewer')
export class ComparisonsController {
  constructor(private readonly comparisons: ComparisonsService) {}

  /** Both versions keep what was known of people when their sheets were made. */
  @Post()
  @HttpCode(200)
  @ApiOkResponse({ type: ComparisonDto })
  compare(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() asked: AskComparisonDto,
  ): Promise<ComparisonDto> {
    return this.comparisons.of(member, productionId, setId, asked);
  }
}
