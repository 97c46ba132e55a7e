import { Body, Controller, Get, HttpCode, Ip, Patch, Post, Req, Res } from '@nestjs/common';
import {
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiOperation,
  ApiTags,
} from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { InjectDataSource } from '@nestjs/typeorm';
import { DataSource } from 'typeorm';
import { Access, CurrentUser, type CurrentUserInfo } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { AccountsService } from './accounts.service';
import { RenameDto, SignInDto, SignUpDto } from './dto/account.dto';
import { MeDto, SessionDto } from './dto/session.dto';
import { readRefreshCookie } from './refresh-cookie';
import { SessionAnswers } from './session-answers';
import { SessionsService } from './sessions.service';

@ApiTags('auth')
@Controller('auth')
export class AuthController {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly accounts: AccountsService,
    private readonly sessions: SessionsService,
    private readonly answers: SessionAnswers,
  ) {}

  @Post('sign-up')
  @Access('public')
  @ApiCreatedResponse({ type: SessionDto })
  async signUp(
    @Body() wanted: SignUpDto,
    @Ip() ip: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionDto> {
    return this.answers.opened(response, await this.accounts.signUp(wanted, ip));
  }

  @Post('sign-in')
  @Access('public')
  @HttpCode(200)
  @ApiOkResponse({ type: SessionDto })
  async signIn(
    @Body() given: SignInDto,
    @Ip() ip: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionDto> {
    return this.answers.opened(response, await this.accounts.signIn(given, ip));
  }

  @Post('refresh')
  @Access('public')
  @HttpCode(200)
  @ApiOperation({ summary: 'A new access token for the cookie; the cookie changes with each use' })
  @ApiOkResponse({ type: SessionDto })
  async refresh(
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionDto> {
    const presented = readRefreshCookie(request);
    if (!presented) throw new Problem(401, 'not-signed-in', 'Sign in first.');
    try {
      return await this.answers.opened(response, await this.sessions.refresh(presented));
    } catch (fault) {
      if (fault instanceof Problem && fault.getStatus() === 401) this.answers.ended(response);
      throw fault;
    }
  }

  @Post('sign-out')
  @Access('public')
  @HttpCode(204)
  @ApiNoContentResponse()
  async signOut(@Req() request: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    const presented = readRefreshCookie(request);
    if (presented) await this.sessions.endByToken(presented);
    this.answers.ended(response);
  }

  @Post('sign-out-everywhere')
  @Access('signed-in')
  @HttpCode(204)
  @ApiNoContentResponse()
  async signOutEverywhere(
    @CurrentUser() user: CurrentUserInfo,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    await this.sessions.endAll(this.dataSource.manager, user.id, 'signed-out');
    this.answers.ended(response);
  }

  @Get('me')
  @Access('signed-in')
  @ApiOkResponse({ type: MeDto })
  me(@CurrentUser() user: CurrentUserInfo): Promise<MeDto> {
    return this.accounts.me(user.id);
  }

  @Patch('me')
  @Access('signed-in')
  @ApiOkResponse({ type: MeDto })
  rename(@CurrentUser() user: CurrentUserInfo, @Body() { name }: RenameDto): Promise<MeDto> {
    return this.accounts.rename(user.id, name);
  }
}
