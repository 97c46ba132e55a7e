import { Controller, Get, Param, StreamableFile } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { download } from '../common/download';
import { IdParam } from '../common/id-param';
import { FitSheetFilesService, type SheetPlace } from './fit-sheet-files.service';

const file = { schema: { type: 'string' as const, format: 'binary' } };

@ApiTags('sets')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId')
@Access('owner', 'designer', 'carpenter', 'reviewer')
export class FitSheetFilesController {
  constructor(private readonly files: FitSheetFilesService) {}

  @Get('draft/fit-sheet.csv')
  @ApiProduces('text/csv')
  @ApiOkResponse(file)
  draftCsv(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<StreamableFile> {
    return this.csv(member, { productionId, setId });
  }

  @Get('draft/fit-sheet.pdf')
  @ApiProduces('application/pdf')
  @ApiOkResponse(file)
  draftPdf(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<StreamableFile> {
    return this.pdf(member, { productionId, setId });
  }

  @Get('revisions/:letter/fit-sheet.csv')
  @ApiProduces('text/csv')
  @ApiOkResponse(file)
  revisionCsv(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Param('letter') letter: string,
  ): Promise<StreamableFile> {
    return this.csv(member, { productionId, setId, letter });
  }

  @Get('revisions/:letter/fit-sheet.pdf')
  @ApiProduces('application/pdf')
  @ApiOkResponse(file)
  revisionPdf(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Param('letter') letter: string,
  ): Promise<StreamableFile> {
    return this.pdf(member, { productionId, setId, letter });
  }

  private async csv(member: MemberInfo, place: SheetPlace): Promise<StreamableFile> {
    const { name, content } = await this.files.csv(member, place);
    return download(content, name, 'csv');
  }

  private async pdf(member: MemberInfo, place: SheetPlace): Promise<StreamableFile> {
    const { name, content } = await this.files.pdf(member, place);
    return download(content, name, 'pdf');
  }
}
