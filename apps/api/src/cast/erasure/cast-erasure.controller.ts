import { Controller, Delete, Get, HttpCode } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../../common/access.decorator';
import { IdParam } from '../../common/id-param';
import { CastErasureService } from './cast-erasure.service';
import { ErasedNames } from './erased-names.service';
import { NamedPlacesDto } from './named-places.dto';

@ApiTags('cast')
@Controller('workshops/:workshopId/productions/:productionId/cast')
export class CastErasureController {
  constructor(
    private readonly erasure: CastErasureService,
    private readonly names: ErasedNames,
  ) {}

  @Get(':castId/named')
  @Access('owner', 'designer')
  @ApiOkResponse({ type: NamedPlacesDto, description: 'where the name of this person was typed' })
  named(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('castId') castId: string,
  ): Promise<NamedPlacesDto> {
    return this.names.find(member, productionId, castId);
  }

  @Delete(':castId')
  @HttpCode(204)
  @Access('owner', 'designer')
  @ApiNoContentResponse({
    description: 'the person is gone from cast, drafts, issued sheets and what people typed',
  })
  erase(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('castId') castId: string,
  ): Promise<void> {
    return this.erasure.erase(member, productionId, castId);
  }
}
