import { Body, Controller, Get, HttpCode, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf } from '../common/page.dto';
import { CreateSetDto, RenameSetDto, SetDto, SetQuery } from './dto/set.dto';
import { SetsService } from './sets.service';

@ApiTags('sets')
@Controller('workshops/:workshopId/productions/:productionId/sets')
export class SetsController {
  constructor(private readonly sets: SetsService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: PageOf(SetDto) })
  list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Query() query: SetQuery,
  ): Promise<Page<SetDto>> {
    return this.sets.list(member, productionId, query);
  }

  @Post()
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: SetDto })
  create(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Body() dto: CreateSetDto,
  ): Promise<SetDto> {
    return this.sets.create(member, productionId, dto);
  }

  @Get(':setId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: SetDto })
  get(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<SetDto> {
    return this.sets.get(member, productionId, setId);
  }

  @Patch(':setId')
  @Access('owner', 'designer')
  @ApiOkResponse({ type: SetDto })
  rename(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() dto: RenameSetDto,
  ): Promise<SetDto> {
    return this.sets.rename(member, productionId, setId, dto);
  }

  @Post(':setId/duplicate')
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: SetDto })
  duplicate(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<SetDto> {
    return this.sets.duplicate(member, productionId, setId);
  }

  @Post(':setId/archive')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: SetDto })
  archive(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<SetDto> {
    return this.sets.archive(member, productionId, setId);
  }

  @Post(':setId/restore')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: SetDto })
  restore(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<SetDto> {
    return this.sets.restore(member, productionId, setId);
  }
}
