import { Body, Controller, Get, HttpCode, Param, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import {
  ApprovalDto,
  ApproveRevisionDto,
  IssueRevisionDto,
  RevisionDetailDto,
  RevisionDto,
} from './dto/revision.dto';
import type { SetRevision } from './entities/set-revision.entity';
import { FitSheetsService } from './fit-sheets.service';
import { RevisionsService } from './revisions.service';

@ApiTags('sets')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId/revisions')
export class RevisionsController {
  constructor(
    private readonly revisions: RevisionsService,
    private readonly fitSheets: FitSheetsService,
  ) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: PageOf(RevisionDto) })
  list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Query() query: PageQuery,
  ): Promise<Page<RevisionDto>> {
    return this.revisions.list(member, productionId, setId, query);
  }

  @Post()
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: RevisionDto })
  issue(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() dto: IssueRevisionDto,
  ): Promise<RevisionDto> {
    return this.revisions.issue(member, productionId, setId, dto);
  }

  @Get(':letter')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: RevisionDetailDto })
  async get(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Param('letter') letter: string,
  ): Promise<RevisionDetailDto> {
    const revision = await this.revisions.find(member, productionId, setId, letter);
    return this.detail(member, productionId, revision);
  }

  @Post(':letter/approval')
  @HttpCode(200)
  @Access('owner', 'reviewer')
  @ApiOkResponse({ type: RevisionDetailDto })
  async approve(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Param('letter') letter: string,
    @Body() dto: ApproveRevisionDto,
  ): Promise<RevisionDetailDto> {
    const revision = await this.revisions.approve(member, productionId, setId, letter, dto);
    return this.detail(member, productionId, revision);
  }

  private async detail(
    member: MemberInfo,
    productionId: string,
    revision: SetRevision,
  ): Promise<RevisionDetailDto> {
    const approvals = await this.revisions.approvalsOf([revision.id]);
    return {
      ...RevisionDto.of(revision, approvals[0]),
      document: revision.document,
      fitSheet: await this.fitSheets.ofRevision(member, productionId, revision),
      approvals: approvals.map((approval) => ApprovalDto.of(approval)),
    };
  }
}
