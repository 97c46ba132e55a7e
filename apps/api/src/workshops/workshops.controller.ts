import { Body, Controller, Get, Patch, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import {
  Access,
  CurrentUser,
  type CurrentUserInfo,
  Member,
  type MemberInfo,
  type Role,
} from '../common/access.decorator';
import { ChangeWorkshopDto, CreateWorkshopDto, WorkshopDto } from './dto/workshop.dto';
import type { Workshop } from './entities/workshop.entity';
import { WorkshopsService } from './workshops.service';

@ApiTags('workshops')
@Controller('workshops')
export class WorkshopsController {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly workshops: WorkshopsService,
  ) {}

  @Post()
  @Access('signed-in')
  @ApiCreatedResponse({ type: WorkshopDto })
  async create(
    @CurrentUser() user: CurrentUserInfo,
    @Body() wanted: CreateWorkshopDto,
  ): Promise<WorkshopDto> {
    const created = await this.dataSource.transaction((manager) =>
      this.workshops.create(manager, user.id, wanted),
    );
    return present(await this.workshops.get(created.id), 'owner');
  }

  @Get(':workshopId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: WorkshopDto })
  async read(@Member() member: MemberInfo): Promise<WorkshopDto> {
    return present(await this.workshops.get(member.workshopId), member.role);
  }

  @Patch(':workshopId')
  @Access('owner')
  @ApiOkResponse({ type: WorkshopDto })
  async change(@Member() member: MemberInfo, @Body() changes: ChangeWorkshopDto): Promise<WorkshopDto> {
    return present(await this.workshops.change(member, changes), member.role);
  }
}

function present(workshop: Workshop, role: Role): WorkshopDto {
  const { id, name, telephone, paper, timeZone, confidence, isDemo } = workshop;
  const confidenceSetAt = workshop.confidenceSetAt?.toISOString() ?? null;
  return { id, name, telephone, paper, timeZone, confidence, confidenceSetAt, isDemo, role };
}
