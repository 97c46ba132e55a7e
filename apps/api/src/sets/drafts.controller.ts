import { Body, Controller, Get, Put } from '@nestjs/common';
import { ApiConflictResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { DraftsService } from './drafts.service';
import { DraftConflictDto, DraftDto, SavedDraftDto, SaveDraftDto } from './dto/draft.dto';
import { FitSheetDto } from './dto/fit-sheet.dto';
import { FitSheetsService } from './fit-sheets.service';

@ApiTags('sets')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId/draft')
export class DraftsController {
  constructor(
    private readonly drafts: DraftsService,
    private readonly fitSheets: FitSheetsService,
  ) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: DraftDto })
  async get(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<DraftDto> {
    return DraftDto.of(await this.drafts.get(member, productionId, setId));
  }

  @Put()
  @Access('owner', 'designer')
  @ApiOkResponse({ type: SavedDraftDto })
  @ApiConflictResponse({ type: DraftConflictDto, description: 'somebody saved meanwhile' })
  async save(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() dto: SaveDraftDto,
  ): Promise<SavedDraftDto> {
    return SavedDraftDto.ofSaved(await this.drafts.save(member, productionId, setId, dto));
  }

  @Get('fit-sheet')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: FitSheetDto })
  async fitSheet(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<FitSheetDto> {
    return (await this.fitSheets.ofDraft(member, productionId, setId)).shown;
  }
}
