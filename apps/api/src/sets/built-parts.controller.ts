import { Body, Controller, Get, Put } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { BuiltPartsService } from './built-parts.service';
import { BuiltPartDto, BuiltPartsDto, SetBuiltDto } from './dto/built.dto';

@ApiTags('sets')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId/built')
export class BuiltPartsController {
  constructor(private readonly built: BuiltPartsService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: BuiltPartsDto })
  async list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<BuiltPartsDto> {
    const parts = await this.built.list(member, productionId, setId);
    return { items: parts.map((part) => BuiltPartDto.of(part)) };
  }

  @Put()
  @Access('owner', 'designer', 'carpenter')
  @ApiOkResponse({ type: BuiltPartsDto })
  async tick(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() dto: SetBuiltDto,
  ): Promise<BuiltPartsDto> {
    const parts = await this.built.tick(member, productionId, setId, dto);
    return { items: parts.map((part) => BuiltPartDto.of(part)) };
  }
}
