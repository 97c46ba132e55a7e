import { Body, Controller, Delete, Get, HttpCode, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import { InvitationDto, InviteDto } from './dto/invitation.dto';
import { InvitationsService } from './invitations.service';

@ApiTags('workshops')
@Access('owner')
@Controller('workshops/:workshopId/invitations')
export class InvitationsController {
  constructor(private readonly invitations: InvitationsService) {}

  @Get()
  @ApiOkResponse({ type: PageOf(InvitationDto) })
  list(@Member() member: MemberInfo, @Query() page: PageQuery): Promise<Page<InvitationDto>> {
    return this.invitations.list(member.workshopId, page);
  }

  @Post()
  @ApiCreatedResponse({ type: InvitationDto })
  invite(@Member() member: MemberInfo, @Body() wanted: InviteDto): Promise<InvitationDto> {
    return this.invitations.invite(member, wanted);
  }

  @Delete(':invitationId')
  @HttpCode(204)
  @ApiNoContentResponse()
  async withdraw(@Member() member: MemberInfo, @IdParam('invitationId') id: string): Promise<void> {
    await this.invitations.withdraw(member, id);
  }
}
