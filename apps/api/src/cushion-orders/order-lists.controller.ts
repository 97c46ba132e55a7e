import { Controller, Get, Header, Param, Req, StreamableFile, UseInterceptors } from '@nestjs/common';
import { ApiOkResponse, ApiParam, ApiProduces, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { Access, Member, type MemberInfo } from '../common/access.decorator';
import { download } from '../common/download';
import { IdParam } from '../common/id-param';
import type { CushionOrder } from './entities/cushion-order.entity';
import { LinkLimits } from './link-limits';
import { LinkService } from './link.service';
import type { OrderContent } from './order-content';
import { orderDxf, scheduleCsv } from './order-lists';
import { OrderPaper } from './order-paper.service';
import { OrdersService } from './orders.service';
import { PrivatePage } from './private-page.interceptor';

const file = { schema: { type: 'string' as const, format: 'binary' } };

async function csv(paper: OrderPaper, order: CushionOrder, content: OrderContent): Promise<StreamableFile> {
  return download(scheduleCsv(await paper.data(order, content)), nameOf(order, content, 'schedule'), 'csv');
}

async function dxf(paper: OrderPaper, order: CushionOrder, content: OrderContent): Promise<StreamableFile> {
  return download(orderDxf(await paper.data(order, content)), nameOf(order, content, 'panels'), 'dxf');
}

const nameOf = ({ number }: CushionOrder, { revisionLetter }: OrderContent, what: string): string =>
  `cushion-order-${number}-${revisionLetter}-${what}`;

/** Lists of an order for the workshop's own programs. */
@ApiTags('cushion orders')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@ApiParam({ name: 'productionId', format: 'uuid' })
@Controller('workshops/:workshopId/productions/:productionId/orders/:orderId')
@Access('owner', 'designer', 'carpenter', 'reviewer')
export class OrderListsController {
  constructor(
    private readonly orders: OrdersService,
    private readonly paper: OrderPaper,
  ) {}

  @Get('schedule.csv')
  @Header('Cache-Control', 'private, no-cache')
  @ApiProduces('text/csv')
  @ApiOkResponse(file)
  async schedule(
    @Member() { workshopId }: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
  ): Promise<StreamableFile> {
    const order = await this.orders.find({ workshopId, productionId, orderId });
    return csv(this.paper, order, order);
  }

  @Get('panels.dxf')
  @Header('Cache-Control', 'private, no-cache')
  @ApiProduces('image/vnd.dxf')
  @ApiOkResponse(file)
  async panels(
    @Member() { workshopId }: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
  ): Promise<StreamableFile> {
    const order = await this.orders.find({ workshopId, productionId, orderId });
    return dxf(this.paper, order, order);
  }
}

/** The same lists for the upholsterer, of what was last sent. */
@ApiTags('order link')
@Controller('link/:token')
@Access('link')
@UseInterceptors(PrivatePage)
export class LinkListsController {
  constructor(
    private readonly links: LinkService,
    private readonly paper: OrderPaper,
    private readonly limits: LinkLimits,
  ) {}

  @Get('schedule.csv')
  @ApiProduces('text/csv')
  @ApiOkResponse(file)
  async schedule(@Param('token') token: string, @Req() request: Request): Promise<StreamableFile> {
    await this.limits.reading(request);
    const { order, sent } = await this.links.open(token);
    return csv(this.paper, order, sent);
  }

  @Get('panels.dxf')
  @ApiProduces('image/vnd.dxf')
  @ApiOkResponse(file)
  async panels(@Param('token') token: string, @Req() request: Request): Promise<StreamableFile> {
    await this.limits.reading(request);
    const { order, sent } = await this.links.open(token);
    return dxf(this.paper, order, sent);
  }
}
