import { Controller, Headers, HttpCode, Post, Req } from '@nestjs/common';
import { ApiNoContentResponse, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { Access } from '../../common/access.decorator';
import { PaymentNews } from './payment-news.service';

/** Where the payment provider tells what happened. Its signature is the key. */
@ApiTags('payments')
@Controller('payments')
@Access('public')
export class PaymentNewsController {
  constructor(private readonly news: PaymentNews) {}

  @Post('events')
  @HttpCode(204)
  @ApiNoContentResponse()
  async receive(@Req() request: Request, @Headers('stripe-signature') signature?: string): Promise<void> {
    const body: unknown = request.body;
    await this.news.receive(Buffer.isBuffer(body) ? body : Buffer.of(), signature ?? '');
  }
}
