import { Body, Controller, Delete, Get, HttpCode, Post } from '@nestjs/common';
import {
  ApiConflictResponse,
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiTags,
} from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { StartStudyDto } from './dto/start-study.dto';
import { ListedStudyDto, StudyDto, StudyListDto } from './dto/study.dto';
import { StudiesService } from './studies.service';

/**
 * What share of a population a set fits. Shares say nothing of any one person, so every member reads them; the means
 * of body measures beside them are for owner and designer only.
 */
@ApiTags('studies')
@Controller('workshops/:workshopId/productions/:productionId/sets/:setId/studies')
export class StudiesController {
  constructor(private readonly studies: StudiesService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: StudyListDto })
  async list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
  ): Promise<StudyListDto> {
    const studies = await this.studies.list(member, productionId, setId);
    return { items: studies.map((study) => ListedStudyDto.of(study)) };
  }

  /** Short ones are done in the answer; of long ones the answer says how many parts there are to count. */
  @Post()
  @Access('owner', 'designer')
  @ApiCreatedResponse({ type: StudyDto })
  @ApiConflictResponse({ description: 'the draft moved on, or too many studies are not done yet' })
  async start(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @Body() body: StartStudyDto,
  ): Promise<StudyDto> {
    return StudyDto.for(member, await this.studies.start(member, productionId, setId, body));
  }

  @Get(':studyId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: StudyDto })
  async get(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @IdParam('studyId') studyId: string,
  ): Promise<StudyDto> {
    return StudyDto.for(member, await this.studies.find(member, productionId, setId, studyId));
  }

  @Post(':studyId/cancel')
  @HttpCode(200)
  @Access('owner', 'designer')
  @ApiOkResponse({ type: StudyDto })
  @ApiConflictResponse({ description: 'it has ended already' })
  async cancel(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @IdParam('studyId') studyId: string,
  ): Promise<StudyDto> {
    return StudyDto.for(member, await this.studies.cancel(member, productionId, setId, studyId));
  }

  @Delete(':studyId')
  @HttpCode(204)
  @Access('owner', 'designer')
  @ApiNoContentResponse()
  remove(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('setId') setId: string,
    @IdParam('studyId') studyId: string,
  ): Promise<void> {
    return this.studies.remove(member, productionId, setId, studyId);
  }
}
