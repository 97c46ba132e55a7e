import { Controller, Get, StreamableFile } from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { download } from '../common/download';
import { IdParam } from '../common/id-param';
import { CastService } from './cast.service';
import { writeCastCsv } from './csv/write-cast-csv';
import { CastMemberDto } from './dto/cast-member.dto';

@ApiTags('cast')
@Controller('workshops/:workshopId/productions/:productionId')
export class CastFilesController {
  constructor(private readonly cast: CastService) {}

  @Get('cast.csv')
  @Access('owner', 'designer')
  @ApiProduces('text/csv')
  @ApiOkResponse({ schema: { type: 'string', format: 'binary' } })
  async csv(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
  ): Promise<StreamableFile> {
    return download(writeCastCsv(await this.cast.all(member, productionId)), 'cast', 'csv');
  }

  @Get('cast/:castId/export')
  @Access('owner', 'designer')
  @ApiOkResponse({ type: CastMemberDto, description: 'all that is held about one person' })
  async export(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('castId') castId: string,
  ): Promise<StreamableFile> {
    const person = CastMemberDto.of(await this.cast.find(member, productionId, castId));
    return download(JSON.stringify(person, null, 2), person.name, 'json');
  }
}
