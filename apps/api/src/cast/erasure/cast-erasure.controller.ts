import { Controller, Delete, HttpCode } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../../common/access.decorator';
import { IdParam } from '../../common/id-param';
import { CastErasureService } from './cast-erasure.service';

@ApiTags('cast')
@Controller('workshops/:workshopId/productions/:productionId/cast')
export class CastErasureController {
  constructor(private readonly erasure: CastErasureService) {}

  @Delete(':castId')
  @HttpCode(204)
  @Access('owner', 'designer')
  @ApiNoContentResponse({ description: 'the person is gone from cast, drafts and issued sheets' })
  erase(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('castId') castId: string,
  ): Promise<void> {
    return this.erasure.erase(member, productionId, castId);
  }
}
