import { Body, Controller, Delete, Get, HttpCode, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import { AddTestSitDto, TestSitDto } from './test-sit.dto';
import { TestSitsService } from './test-sits.service';

@ApiTags('sets')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId/test-sits')
export class TestSitsController {
  constructor(private readonly sits: TestSitsService) {}

  @Get()
  @Access('owner', 'designer')
  @ApiOkResponse({ type: PageOf(TestSitDto) })
  async list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Query() query: PageQuery,
  ): Promise<Page<TestSitDto>> {
    const page = await this.sits.list(member, productionId, setId, query);
    return { ...page, items: page.items.map((row) => TestSitDto.of(row)) };
  }

  @Post()
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: TestSitDto })
  async add(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() dto: AddTestSitDto,
  ): Promise<TestSitDto> {
    return TestSitDto.of(await this.sits.add(member, productionId, setId, dto));
  }

  @Delete(':sitId')
  @HttpCode(204)
  @Access('owner', 'designer')
  @ApiNoContentResponse({ description: 'what it said of a foam stays in the set until it is taken anew' })
  remove(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @IdParam('sitId') sitId: string,
  ): Promise<void> {
    return this.sits.remove(member, productionId, setId, sitId);
  }
}
