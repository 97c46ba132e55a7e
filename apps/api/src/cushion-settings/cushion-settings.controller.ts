import { Body, Controller, Get, Put } from '@nestjs/common';
import { ApiConflictResponse, ApiOkResponse, ApiParam, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { ProblemBody } from '../common/problem';
import { CushionSettingsDto, SaveCushionSettingsDto } from './cushion-settings.dto';
import { CushionSettingsService } from './cushion-settings.service';

@ApiTags('workshops')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@Controller('workshops/:workshopId/cushion-settings')
export class CushionSettingsController {
  constructor(private readonly settings: CushionSettingsService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: CushionSettingsDto })
  async read(@Member() { workshopId }: MemberInfo): Promise<CushionSettingsDto> {
    return CushionSettingsDto.of(await this.settings.read(workshopId));
  }

  @Put()
  @Access('owner', 'designer')
  @ApiOkResponse({ type: CushionSettingsDto })
  @ApiConflictResponse({ type: ProblemBody, description: 'somebody changed them meanwhile' })
  async save(
    @Member() member: MemberInfo,
    @Body() body: SaveCushionSettingsDto,
  ): Promise<CushionSettingsDto> {
    return CushionSettingsDto.of(await this.settings.save(member, body));
  }
}
