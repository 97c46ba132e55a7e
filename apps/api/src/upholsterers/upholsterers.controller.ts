import { Body, Controller, Delete, Get, HttpCode, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiParam, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import { CreateUpholstererDto, UpdateUpholstererDto, UpholstererDto } from './dto/upholsterer.dto';
import { UpholsterersService } from './upholsterers.service';

@ApiTags('upholsterers')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@Controller('workshops/:workshopId/upholsterers')
@Access('owner', 'designer')
export class UpholsterersController {
  constructor(private readonly upholsterers: UpholsterersService) {}

  @Get()
  @ApiOkResponse({ type: PageOf(UpholstererDto) })
  async list(@Member() member: MemberInfo, @Query() query: PageQuery): Promise<Page<UpholstererDto>> {
    const page = await this.upholsterers.list(member.workshopId, query);
    return { ...page, items: page.items.map((item) => UpholstererDto.of(item)) };
  }

  @Post()
  @ApiCreatedResponse({ type: UpholstererDto })
  async create(@Member() member: MemberInfo, @Body() body: CreateUpholstererDto): Promise<UpholstererDto> {
    return UpholstererDto.of(await this.upholsterers.create(member, body));
  }

  @Patch(':upholstererId')
  @ApiOkResponse({ type: UpholstererDto })
  async update(
    @Member() member: MemberInfo,
    @IdParam('upholstererId') id: string,
    @Body() body: UpdateUpholstererDto,
  ): Promise<UpholstererDto> {
    return UpholstererDto.of(await this.upholsterers.update(member, id, body));
  }

  @Delete(':upholstererId')
  @HttpCode(204)
  @ApiNoContentResponse()
  remove(@Member() member: MemberInfo, @IdParam('upholstererId') id: string): Promise<void> {
    return this.upholsterers.remove(member, id);
  }
}
