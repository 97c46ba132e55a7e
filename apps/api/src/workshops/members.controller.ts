import { Body, Controller, Delete, Get, HttpCode, Patch, Query } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import { ChangeRoleDto, MemberDto } from './dto/workshop.dto';
import { MembersService } from './members.service';

@ApiTags('workshops')
@Controller('workshops/:workshopId/members')
export class MembersController {
  constructor(private readonly members: MembersService) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: PageOf(MemberDto) })
  list(@Member() member: MemberInfo, @Query() page: PageQuery): Promise<Page<MemberDto>> {
    return this.members.list(member, page);
  }

  @Patch(':userId')
  @Access('owner')
  @ApiOkResponse({ type: MemberDto })
  changeRole(
    @Member() member: MemberInfo,
    @IdParam('userId') userId: string,
    @Body() { role }: ChangeRoleDto,
  ): Promise<MemberDto> {
    return this.members.changeRole(member, userId, role);
  }

  @Delete(':userId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @HttpCode(204)
  @ApiNoContentResponse()
  async remove(@Member() member: MemberInfo, @IdParam('userId') userId: string): Promise<void> {
    await this.members.remove(member, userId);
  }
}
