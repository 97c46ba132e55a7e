import { Body, Controller, Get, HttpCode, Post } from '@nestjs/common';
import { ApiOkResponse, ApiParam, ApiTags } from '@nestjs/swagger';
import { Access, Member, type MemberInfo } from '../../common/access.decorator';
import { IdParam } from '../../common/id-param';
import { MailBouncedDto } from '../dto/write-order.dto';
import { InspectDto } from '../inspections/inspection.dto';
import { InspectionsService } from '../inspections/inspections.service';
import { OrderCorrespondence } from '../order-correspondence.service';
import { AnswerQuestionDto, AskQuestionDto } from '../questions/question.dto';
import { QuestionsService } from '../questions/questions.service';
import { DeclineQuoteDto, RecordQuoteDto } from '../quotes/quote.dto';
import { QuotesService } from '../quotes/quotes.service';
import { OrderLifeDto } from './order-life.dto';
import { OrderLife } from './order-life.service';

/** The workshop's side of an order's life; every answer is the life as it stands then. */
@ApiTags('cushion orders')
@ApiParam({ name: 'workshopId', format: 'uuid' })
@ApiParam({ name: 'productionId', format: 'uuid' })
@ApiParam({ name: 'orderId', format: 'uuid' })
@Controller('workshops/:workshopId/productions/:productionId/orders/:orderId')
@Access('owner', 'designer')
export class OrderLifeController {
  constructor(
    private readonly life: OrderLife,
    private readonly quotes: QuotesService,
    private readonly questions: QuestionsService,
    private readonly inspections: InspectionsService,
    private readonly correspondence: OrderCorrespondence,
  ) {}

  @Get('life')
  @ApiOkResponse({ type: OrderLifeDto })
  read(
    @Member() { workshopId }: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
  ): Promise<OrderLifeDto> {
    return this.life.forMember({ workshopId, productionId, orderId });
  }

  @Post('quotes')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async recordQuote(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: RecordQuoteDto,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.quotes.record(member, place, body);
    return this.life.forMember(place);
  }

  @Post('quotes/:quoteId/accept')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async acceptQuote(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @IdParam('quoteId') quoteId: string,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.quotes.accept(member, place, quoteId);
    return this.life.forMember(place);
  }

  @Post('quotes/:quoteId/decline')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async declineQuote(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @IdParam('quoteId') quoteId: string,
    @Body() body: DeclineQuoteDto,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.quotes.decline(member, place, quoteId, body.reason);
    return this.life.forMember(place);
  }

  @Post('questions')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async ask(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: AskQuestionDto,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.questions.ask(member, place, body);
    return this.life.forMember(place);
  }

  @Post('questions/:questionId/answer')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async answer(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @IdParam('questionId') questionId: string,
    @Body() body: AnswerQuestionDto,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.questions.answer(member, place, questionId, body.answer);
    return this.life.forMember(place);
  }

  @Post('inspections')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async inspect(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @Body() body: InspectDto,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.inspections.inspect(member, place, body);
    return this.life.forMember(place);
  }

  @Post('mails/:mailId/send-again')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async sendMailAgain(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @IdParam('mailId') mailId: string,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.correspondence.sendMailAgain(member, place, mailId);
    return this.life.forMember(place);
  }

  @Post('mails/:mailId/bounced')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async mailBounced(
    @Member() member: MemberInfo,
    @IdParam('productionId') productionId: string,
    @IdParam('orderId') orderId: string,
    @IdParam('mailId') mailId: string,
    @Body() body: MailBouncedDto,
  ): Promise<OrderLifeDto> {
    const place = { workshopId: member.workshopId, productionId, orderId };
    await this.correspondence.mailBounced(member, place, mailId, body.note);
    return this.life.forMember(place);
  }
}
