import { Body, Controller, HttpCode, Param, Post, StreamableFile } from '@nestjs/common';
import { ApiConflictResponse, ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { download } from '../common/download';
import { IdParam } from '../common/id-param';
import { AskStickDto } from './dto/asked.dto';
import { StoryStickDto } from './dto/story-stick.dto';
import { StickPapers } from './stick-papers.service';
import type { VersionPlace } from './versions.service';

const file = { schema: { type: 'string' as const, format: 'binary' } };
const MOVED_ON = { description: 'the draft moved on' };

/** Where each sitter fits along one number of a set. A question changes nothing; it is sent as a body for its length. */
@ApiTags('choices')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId')
@Access('owner', 'designer', 'carpenter', 'reviewer')
export class StorySticksController {
  constructor(private readonly papers: StickPapers) {}

  @Post('draft/story-stick')
  @HttpCode(200)
  @ApiOkResponse({ type: StoryStickDto })
  @ApiConflictResponse(MOVED_ON)
  ofDraft(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() asked: AskStickDto,
  ): Promise<StoryStickDto> {
    return this.papers.answer(member, { productionId, setId }, asked);
  }

  @Post('revisions/:letter/story-stick')
  @HttpCode(200)
  @ApiOkResponse({ type: StoryStickDto })
  ofRevision(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Param('letter') letter: string,
    @Body() asked: AskStickDto,
  ): Promise<StoryStickDto> {
    return this.papers.answer(member, { productionId, setId, letter }, asked);
  }

  @Post('draft/story-stick.pdf')
  @HttpCode(200)
  @ApiProduces('application/pdf')
  @ApiOkResponse(file)
  @ApiConflictResponse(MOVED_ON)
  draftPdf(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() asked: AskStickDto,
  ): Promise<StreamableFile> {
    return this.pdf(member, { productionId, setId }, asked);
  }

  @Post('revisions/:letter/story-stick.pdf')
  @HttpCode(200)
  @ApiProduces('application/pdf')
  @ApiOkResponse(file)
  revisionPdf(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Param('letter') letter: string,
    @Body() asked: AskStickDto,
  ): Promise<StreamableFile> {
    return this.pdf(member, { productionId, setId, letter }, asked);
  }

  private async pdf(member: MemberInfo, place: VersionPlace, asked: AskStickDto): Promise<StreamableFile> {
    const { name, content } = await this.papers.pdf(member, place, asked);
    return download(content, name, 'pdf');
  }
}
