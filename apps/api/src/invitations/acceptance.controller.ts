import { Body, Controller, Get, HttpCode, Ip, Param, Post, Res } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Response } from 'express';
import { SessionDto } from '../auth/dto/session.dto';
import { SessionAnswers } from '../auth/session-answers';
import { Access, type CurrentUserInfo, PerhapsUser } from '../common/access.decorator';
import { AcceptanceService } from './acceptance.service';
import { AcceptInvitationDto, OpenInvitationDto } from './dto/invitation.dto';

@ApiTags('invitations')
@Access('link')
@Controller('invitations/:token')
export class AcceptanceController {
  constructor(
    private readonly acceptance: AcceptanceService,
    private readonly answers: SessionAnswers,
  ) {}

  @Get()
  @ApiOkResponse({ type: OpenInvitationDto })
  read(@Param('token') token: string): Promise<OpenInvitationDto> {
    return this.acceptance.read(token);
  }

  @Post('accept')
  @HttpCode(200)
  @ApiOkResponse({ type: SessionDto })
  async accept(
    @Param('token') token: string,
    @Body() given: AcceptInvitationDto,
    @PerhapsUser() user: CurrentUserInfo | null,
    @Ip() ip: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionDto> {
    return this.answers.opened(response, await this.acceptance.accept(token, given, user?.id ?? null, ip));
  }
}
