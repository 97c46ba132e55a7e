import {
  Body,
  Controller,
  Get,
  HttpCode,
  Param,
  Post,
  Query,
  Req,
  StreamableFile,
  UseInterceptors,
} from '@nestjs/common';
import { ApiOkResponse, ApiProduces, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { Access } from '../common/access.decorator';
import { PackQuery } from './dto/pack-query.dto';
import { PublicOrderDto } from './dto/public-order.dto';
import { AcknowledgeDto, WriteMessageDto } from './dto/write-order.dto';
import { LinkLimits } from './link-limits';
import { LinkService } from './link.service';
import { OrderPaper } from './order-paper.service';
import { OrderViews } from './order-views.service';
import { pdfFile } from './pdf-file';
import { PrivatePage } from './private-page.interceptor';

/** The upholsterer's way in: no account, one order. */
@ApiTags('order link')
@Controller('link/:token')
@Access('link')
@UseInterceptors(PrivatePage)
export class LinkController {
  constructor(
    private readonly links: LinkService,
    private readonly views: OrderViews,
    private readonly paper: OrderPaper,
    private readonly limits: LinkLimits,
  ) {}

  @Get()
  @ApiOkResponse({ type: PublicOrderDto })
  async read(@Param('token') token: string, @Req() request: Request): Promise<PublicOrderDto> {
    await this.limits.reading(request);
    return this.views.public(await this.links.open(token));
  }

  @Get('spec.pdf')
  @ApiProduces('application/pdf')
  @ApiOkResponse({ schema: { type: 'string', format: 'binary' } })
  async specPdf(
    @Param('token') token: string,
    @Req() request: Request,
    @Query() wanted: PackQuery,
  ): Promise<StreamableFile> {
    await this.limits.reading(request);
    const { order, sent } = await this.links.open(token);
    return pdfFile(await this.paper.pack(order, sent, wanted), order.number, sent.revisionLetter);
  }

  @Post('acknowledge')
  @HttpCode(200)
  @ApiOkResponse({ type: PublicOrderDto })
  async acknowledge(
    @Param('token') token: string,
    @Req() request: Request,
    @Body() body: AcknowledgeDto,
  ): Promise<PublicOrderDto> {
    await this.limits.answering(token, request);
    await this.links.acknowledge(token, body.name, body.sentAt);
    return this.views.public(await this.links.open(token));
  }

  @Post('reply')
  @HttpCode(200)
  @ApiOkResponse({ type: PublicOrderDto })
  async reply(
    @Param('token') token: string,
    @Req() request: Request,
    @Body() body: WriteMessageDto,
  ): Promise<PublicOrderDto> {
    await this.limits.answering(token, request);
    await this.links.reply(token, body.text);
    return this.views.public(await this.links.open(token));
  }
}
