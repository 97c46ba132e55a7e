import { Controller, Get, Query, StreamableFile } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiPropertyOptional, ApiTags } from '@nestjs/swagger';
import { IsOptional, IsUUID } from 'class-validator';
import { Access, Member, type MemberInfo } from '../../common/access.decorator';
import { download } from '../../common/download';
import { IdParam } from '../../common/id-param';
import { MeasureNextDto } from './dto/measure-next.dto';
import { MeasureNextService } from './measure-next.service';
import { MeasuringSheetService } from './measuring-sheet.service';

export class MeasuringSheetQuery {
  @ApiPropertyOptional({ format: 'uuid', description: 'one person; everybody when left out' })
  @IsOptional()
  @IsUUID()
  person?: string;
}

@ApiTags('cast')
@Controller('workshops/:workshopId/productions/:productionId')
@Access('owner', 'designer')
export class MeasuringController {
  constructor(
    private readonly next: MeasureNextService,
    private readonly sheets: MeasuringSheetService,
  ) {}

  @Get('cast/measure-next')
  @ApiOkResponse({
    type: MeasureNextDto,
    description: 'which tape measures settle most, over all sets in use that each person sits in',
  })
  ofProduction(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
  ): Promise<MeasureNextDto> {
    return this.next.ofProduction(member, productionId);
  }

  @Get('sets/:setId/draft/measure-next')
  @ApiOkResponse({
    type: MeasureNextDto,
    description: 'which tape measures settle most of what the draft’s fit sheet does not know',
  })
  ofSet(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<MeasureNextDto> {
    return this.next.ofSet(member, productionId, setId);
  }

  @Get('cast/measuring-sheet.pdf')
  @ApiProduces('application/pdf')
  @ApiOkResponse({
    schema: { type: 'string', format: 'binary' },
    description: 'a sheet to write measures on, with a drawing of each; two pages a person',
  })
  async sheet(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Query() { person }: MeasuringSheetQuery,
  ): Promise<StreamableFile> {
    const { name, content } = await this.sheets.pdf(member, productionId, person);
    return download(content, name, 'pdf');
  }
}
