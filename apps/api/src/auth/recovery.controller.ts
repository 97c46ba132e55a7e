import { Body, Controller, HttpCode, Ip, Post } from '@nestjs/common';
import { ApiAcceptedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { Access, CurrentUser, type CurrentUserInfo } from '../common/access.decorator';
import {
  AskPasswordResetDto,
  ChangeEmailDto,
  ConfirmedEmailDto,
  ConfirmEmailDto,
  ConfirmPasswordResetDto,
} from './dto/account.dto';
import { RecoveryService } from './recovery.service';

@ApiTags('auth')
@Controller('auth')
export class RecoveryController {
  constructor(private readonly recovery: RecoveryService) {}

  @Post('password-reset')
  @Access('public')
  @HttpCode(202)
  @ApiAcceptedResponse({ description: 'A mail was sent if there is such an account' })
  async askPasswordReset(@Body() { email }: AskPasswordResetDto, @Ip() ip: string): Promise<void> {
    await this.recovery.askPasswordReset(email, ip);
  }

  @Post('password-reset/confirm')
  @Access('public')
  @HttpCode(204)
  @ApiNoContentResponse()
  async resetPassword(@Body() { token, password }: ConfirmPasswordResetDto, @Ip() ip: string): Promise<void> {
    await this.recovery.resetPassword(token, password, ip);
  }

  @Post('email/confirm')
  @Access('public')
  @HttpCode(200)
  @ApiOkResponse({ type: ConfirmedEmailDto })
  async confirmEmail(@Body() { token }: ConfirmEmailDto, @Ip() ip: string): Promise<ConfirmedEmailDto> {
    return { email: await this.recovery.confirmEmail(token, ip) };
  }

  @Post('email/resend')
  @Access('signed-in')
  @HttpCode(202)
  @ApiAcceptedResponse()
  async resendConfirmation(@CurrentUser() user: CurrentUserInfo, @Ip() ip: string): Promise<void> {
    await this.recovery.resendConfirmation(user.id, ip);
  }

  @Post('email/change')
  @Access('signed-in')
  @HttpCode(202)
  @ApiAcceptedResponse({ description: 'A mail was sent to the new address; it is used once confirmed' })
  async changeEmail(
    @CurrentUser() user: CurrentUserInfo,
    @Body() { newEmail, password }: ChangeEmailDto,
    @Ip() ip: string,
  ): Promise<void> {
    await this.recovery.askEmailChange(user.id, newEmail, password, ip);
  }
}
