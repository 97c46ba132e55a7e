import { Body, Controller, Get, HttpCode, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf } from '../common/page.dto';
import {
  CreateProductionDto,
  PatchProductionDto,
  ProductionDto,
  ProductionQuery,
} from './dto/production.dto';
import { ProductionsService } from './productions.service';

@ApiTags('productions')
@Controller('workshops/:workshopId/productions')
export class ProductionsController {
  constructor(private readonly productions: ProductionsService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: PageOf(ProductionDto) })
  async list(@Member() member: MemberInfo, @Query() query: ProductionQuery): Promise<Page<ProductionDto>> {
    const page = await this.productions.list(member, query);
    return { ...page, items: page.items.map((production) => ProductionDto.of(production)) };
  }

  @Post()
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: ProductionDto })
  async create(@Member() member: MemberInfo, @Body() dto: CreateProductionDto): Promise<ProductionDto> {
    return ProductionDto.of(await this.productions.create(member, dto));
  }

  @Get(':productionId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: ProductionDto })
  async get(@Member() member: MemberInfo, @IdParam('productionId') id: string): Promise<ProductionDto> {
    return ProductionDto.of(await this.productions.forReading(member, id));
  }

  @Patch(':productionId')
  @Access('owner', 'designer')
  @ApiOkResponse({ type: ProductionDto })
  async patch(
    @Member() member: MemberInfo,
    @IdParam('productionId') id: string,
    @Body() dto: PatchProductionDto,
  ): Promise<ProductionDto> {
    return ProductionDto.of(await this.productions.patch(member, id, dto));
  }

  @Post(':productionId/archive')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: ProductionDto })
  async archive(@Member() member: MemberInfo, @IdParam('productionId') id: string): Promise<ProductionDto> {
    return ProductionDto.of(await this.productions.archive(member, id));
  }

  @Post(':productionId/restore')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: ProductionDto })
  async restore(@Member() member: MemberInfo, @IdParam('productionId') id: string): Promise<ProductionDto> {
    return ProductionDto.of(await this.productions.restore(member, id));
  }
}
