import { Body, Controller, Get, HttpCode, Patch, Post, Query, Res, StreamableFile } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiParam, ApiProduces, ApiTags } from '@nestjs/swagger';
import type { Response } from 'express';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { IdParam } from '../common/id-param';
import { type Page, PageOf, PageQuery } from '../common/page.dto';
import { OrderDto, OrderMessageDto, OrderSummaryDto } from './dto/order.dto';
import { PackQuery } from './dto/pack-query.dto';
import {
  CancelOrderDto,
  CreateOrderDto,
  RecordStateDto,
  SendOrderDto,
  UpdateOrderDto,
  WriteMessageDto,
} from './dto/write-order.dto';
import { OrderCorrespondence } from './order-correspondence.service';
import { OrderPaper } from './order-paper.service';
import { OrderProgress } from './order-progress.service';
import { messageDto, OrderViews } from './order-views.service';
import { OrdersService } from './orders.service';
import { pdfFile } from './pdf-file';

@ApiTags('cushion orders')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@ApiParam({ name: 'productionId', format: 'uuid' })
@Controller('workshops/:workshopId/productions/:productionId/orders')
@Access('owner', 'designer')
export class OrdersController {
  constructor(
    private readonly orders: OrdersService,
    private readonly correspondence: OrderCorrespondence,
    private readonly progress: OrderProgress,
    private readonly views: OrderViews,
    private readonly paper: OrderPaper,
  ) {}

  @Get()
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: PageOf(OrderSummaryDto) })
  async list(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Query() query: PageQuery,
  ): Promise<Page<OrderSummaryDto>> {
    const page = await this.orders.list(member, productionId, query);
    return { ...page, items: await this.views.summaries(page.items) };
  }

  @Post()
  @ApiCreatedResponse({ type: OrderDto })
  async create(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @Body() body: CreateOrderDto,
  ): Promise<OrderDto> {
    return this.views.full(member, await this.orders.create(member, productionId, body));
  }

  @Get(':orderId')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiOkResponse({ type: OrderDto })
  async get(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
  ): Promise<OrderDto> {
    return this.views.full(member, await this.orders.find(placeOf(member, productionId, orderId)));
  }

  @Patch(':orderId')
  @ApiOkResponse({ type: OrderDto })
  async update(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: UpdateOrderDto,
  ): Promise<OrderDto> {
    const order = await this.orders.update(member, placeOf(member, productionId, orderId), body);
    return this.views.full(member, order);
  }

  @Get(':orderId/spec.pdf')
  @Access('owner', 'designer', 'carpenter', 'reviewer')
  @ApiProduces('application/pdf')
  @ApiOkResponse({ schema: { type: 'string', format: 'binary' } })
  async specPdf(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Query() wanted: PackQuery,
    @Res({ passthrough: true }) response: Response,
  ): Promise<StreamableFile> {
    const order = await this.orders.find(placeOf(member, productionId, orderId));
    response.set('Cache-Control', 'private, no-cache');
    return pdfFile(await this.paper.pack(order, order, wanted), order.number, order.revisionLetter);
  }

  @Post(':orderId/send')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderDto })
  async send(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: SendOrderDto,
  ): Promise<OrderDto> {
    const order = await this.correspondence.send(member, placeOf(member, productionId, orderId), body);
    return this.views.full(member, order);
  }

  @Post(':orderId/cancel')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderDto })
  async cancel(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: CancelOrderDto,
  ): Promise<OrderDto> {
    const place = placeOf(member, productionId, orderId);
    return this.views.full(member, await this.progress.record(member, place, 'cancelled', body.note ?? ''));
  }

  @Post(':orderId/state')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderDto })
  async recordState(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: RecordStateDto,
  ): Promise<OrderDto> {
    const place = placeOf(member, productionId, orderId);
    return this.views.full(member, await this.progress.record(member, place, body.to, body.note ?? ''));
  }

  @Get(':orderId/messages')
  @ApiOkResponse({ type: PageOf(OrderMessageDto) })
  async messages(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Query() query: PageQuery,
  ): Promise<Page<OrderMessageDto>> {
    const page = await this.correspondence.messages(placeOf(member, productionId, orderId), query);
    return { ...page, items: page.items.map(messageDto) };
  }

  @Post(':orderId/messages')
  @ApiCreatedResponse({ type: OrderMessageDto })
  async write(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: WriteMessageDto,
  ): Promise<OrderMessageDto> {
    return messageDto(
      await this.correspondence.write(member, placeOf(member, productionId, orderId), body.text),
    );
  }

  @Post(':orderId/mail/send-again')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderDto })
  async sendMailAgain(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
  ): Promise<OrderDto> {
    const order = await this.correspondence.sendMailAgain(member, placeOf(member, productionId, orderId));
    return this.views.full(member, order);
  }

  @Post(':orderId/link/revoke')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderDto })
  async revokeLink(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
  ): Promise<OrderDto> {
    const order = await this.correspondence.revokeLink(member, placeOf(member, productionId, orderId));
    return this.views.full(member, order);
  }

  @Post(':orderId/link/renew')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderDto })
  async renewLink(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
  ): Promise<OrderDto> {
    const order = await this.correspondence.renewLink(member, placeOf(member, productionId, orderId));
    return this.views.full(member, order);
  }
}

function placeOf(member: MemberInfo, productionId: string, orderId: string) {
  return { workshopId: member.workshopId, productionId, orderId };
}
