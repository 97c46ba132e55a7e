import { Body, Controller, Get, HttpCode, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { PageQuery } from '../common/page.dto';
import { CastService } from './cast.service';
import { CastMemberDto, CastNameDto, CastPageDto } from './dto/cast-member.dto';
import { CastImportDto, CastImportPreviewDto, ImportCastDto } from './dto/import-cast.dto';
import { CreateCastMemberDto, PatchCastMemberDto } from './dto/save-cast-member.dto';
import { seesMeasures } from './sees-measures';

@ApiTags('cast')
@Controller('workshops/:workshopId/productions/:productionId/cast')
export class CastController {
  constructor(private readonly cast: CastService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: CastPageDto })
  async list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Query() query: PageQuery,
  ): Promise<CastPageDto> {
    const page = await this.cast.list(member, productionId, query);
    const items = seesMeasures(member)
      ? page.items.map((person) => CastMemberDto.of(person))
      : page.items.map((person) => CastNameDto.of(person));
    return { ...page, items };
  }

  @Post()
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: CastMemberDto })
  async create(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Body() dto: CreateCastMemberDto,
  ): Promise<CastMemberDto> {
    return CastMemberDto.of(await this.cast.create(member, productionId, dto));
  }

  @Post('import/preview')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: CastImportPreviewDto })
  async preview(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Body() dto: ImportCastDto,
  ): Promise<CastImportPreviewDto> {
    return CastImportPreviewDto.of(await this.cast.previewImport(member, productionId, dto.csv));
  }

  @Post('import')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: CastImportDto })
  async import(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Body() dto: ImportCastDto,
  ): Promise<CastImportDto> {
    return CastImportDto.of(await this.cast.import(member, productionId, dto.csv));
  }

  @Patch(':castId')
  @Access('owner', 'designer')
  @ApiOkResponse({ type: CastMemberDto })
  async patch(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('castId') castId: string,
    @Body() dto: PatchCastMemberDto,
  ): Promise<CastMemberDto> {
    return CastMemberDto.of(await this.cast.patch(member, productionId, castId, dto));
  }
}
