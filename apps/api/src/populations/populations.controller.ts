import { Body, Controller, Delete, Get, HttpCode, Post, Query, StreamableFile } from '@nestjs/common';
import {
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiParam,
  ApiProduces,
  ApiTags,
} from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { download } from '../common/download';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import { PopulationDetailsDto, PopulationDto } from './dto/population.dto';
import { CreatePopulationDto, PopulationPreviewDto, PreviewPopulationDto } from './dto/upload.dto';
import { PopulationsService } from './populations.service';

/** People whom a workshop measured itself. */
@ApiTags('populations')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@Controller('workshops/:workshopId/populations')
export class PopulationsController {
  constructor(private readonly populations: PopulationsService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: PageOf(PopulationDto) })
  list(@Member() member: MemberInfo, @Query() query: PageQuery): Promise<Page<PopulationDto>> {
    return this.populations.list(member, query);
  }

  /** Reads a table without keeping anything. */
  @Post('preview')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: PopulationPreviewDto })
  preview(@Body() body: PreviewPopulationDto): PopulationPreviewDto {
    return this.populations.preview(body);
  }

  @Post()
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: PopulationDetailsDto })
  create(@Member() member: MemberInfo, @Body() body: CreatePopulationDto): Promise<PopulationDetailsDto> {
    return this.populations.create(member, body);
  }

  @Get(':populationId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: PopulationDetailsDto })
  get(@Member() member: MemberInfo, @IdParam('populationId') id: string): Promise<PopulationDetailsDto> {
    return this.populations.get(member, id);
  }

  @Delete(':populationId')
  @HttpCode(204)
  @Access('owner', 'designer')
  @ApiNoContentResponse()
  remove(@Member() member: MemberInfo, @IdParam('populationId') id: string): Promise<void> {
    return this.populations.remove(member, id);
  }

  @Get(':populationId/rows.csv')
  @Access('owner')
  @ApiProduces('text/csv')
  @ApiOkResponse({
    schema: { type: 'string', format: 'binary' },
    description: 'the rows, where they were kept',
  })
  async rows(@Member() member: MemberInfo, @IdParam('populationId') id: string): Promise<StreamableFile> {
    const { name, csv } = await this.populations.rows(member, id);
    return download(csv, name, 'csv');
  }

  @Delete(':populationId/rows')
  @HttpCode(204)
  @Access('owner', 'designer')
  @ApiNoContentResponse({ description: 'only the statistics are left' })
  forgetRows(@Member() member: MemberInfo, @IdParam('populationId') id: string): Promise<void> {
    return this.populations.forgetRows(member, id);
  }
}
