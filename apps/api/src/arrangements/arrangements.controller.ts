import { Body, Controller, Delete, Get, HttpCode, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiParam, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import { ArrangementDto, KeepArrangementDto } from './arrangement.dto';
import { ArrangementsService } from './arrangements.service';

@ApiTags('workshops')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@Controller('workshops/:workshopId/arrangements')
@Access('owner', 'designer')
export class ArrangementsController {
  constructor(private readonly arrangements: ArrangementsService) {}

  @Get()
  @ApiOkResponse({ type: PageOf(ArrangementDto) })
  async list(@Member() member: MemberInfo, @Query() query: PageQuery): Promise<Page<ArrangementDto>> {
    const page = await this.arrangements.list(member.workshopId, query);
    return { ...page, items: page.items.map((item) => ArrangementDto.of(item)) };
  }

  @Post()
  @ApiCreatedResponse({ type: ArrangementDto })
  async keep(@Member() member: MemberInfo, @Body() body: KeepArrangementDto): Promise<ArrangementDto> {
    return ArrangementDto.of(await this.arrangements.keep(member, body));
  }

  @Delete(':arrangementId')
  @HttpCode(204)
  @ApiNoContentResponse()
  remove(@Member() member: MemberInfo, @IdParam('arrangementId') id: string): Promise<void> {
    return this.arrangements.remove(member, id);
  }
}
