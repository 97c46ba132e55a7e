import { Body, Controller, HttpCode, Post } from '@nestjs/common';
import { ApiOkResponse, ApiParam, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../../common/access.decorator';
import { IdParam } from '../../common/id-param';
import { OrderLifeDto } from '../life/order-life.dto';
import { OrderLife } from '../life/order-life.service';
import { BeginDepositDto, CheckoutDto, RecordPaymentDto } from './deposit.dto';
import { DepositsService } from './deposits.service';

@ApiTags('cushion orders')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@ApiParam({ name: 'productionId', format: 'uuid' })
@ApiParam({ name: 'orderId', format: 'uuid' })
@Controller('workshops/:workshopId/productions/:productionId/orders/:orderId/payments')
@Access('owner', 'designer')
export class DepositsController {
  constructor(
    private readonly deposits: DepositsService,
    private readonly life: OrderLife,
  ) {}

  @Post('checkout')
  @HttpCode(200)
  @ApiOkResponse({ type: CheckoutDto })
  begin(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: BeginDepositDto,
  ): Promise<CheckoutDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    return this.deposits.begin(member, place, body.amountMinor);
  }

  @Post()
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async record(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: RecordPaymentDto,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.deposits.record(member, place, body);
    return this.life.forMember(place);
  }

  @Post(':paymentId/end')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async end(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @IdParam('paymentId') paymentId: string,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.deposits.end(member, place, paymentId);
    return this.life.forMember(place);
  }
}
