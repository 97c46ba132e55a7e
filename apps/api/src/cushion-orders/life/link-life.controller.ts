import { Body, Controller, Get, HttpCode, Param, Post, Req, UseInterceptors } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import type { Request } from 'express';
import { Access } from '../../common/access.decorator';
import { IdParam } from '../../common/id-param';
import { MarkStateDto } from '../dto/write-order.dto';
import { LinkLimits } from '../link-limits';
import { OrderMarks } from '../order-marks.service';
import { PrivatePage } from '../private-page.interceptor';
import { AnswerQuestionDto, AskQuestionDto } from '../questions/question.dto';
import { QuestionsService } from '../questions/questions.service';
import { GiveQuoteDto } from '../quotes/quote.dto';
import { QuotesService } from '../quotes/quotes.service';
import { OrderLifeDto } from './order-life.dto';
import { OrderLife } from './order-life.service';

/** The upholsterer's side of an order's life: one order, by its private link. */
@ApiTags('order link')
@Controller('link/:token')
@Access('link')
@UseInterceptors(PrivatePage)
export class LinkLifeController {
  constructor(
    private readonly life: OrderLife,
    private readonly quotes: QuotesService,
    private readonly questions: QuestionsService,
    private readonly marks: OrderMarks,
    private readonly limits: LinkLimits,
  ) {}

  @Get('life')
  @ApiOkResponse({ type: OrderLifeDto })
  async read(@Param('token') token: string, @Req() request: Request): Promise<OrderLifeDto> {
    await this.limits.reading(request);
    return this.life.forLink(token);
  }

  @Post('quote')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async quote(
    @Param('token') token: string,
    @Req() request: Request,
    @Body() body: GiveQuoteDto,
  ): Promise<OrderLifeDto> {
    await this.limits.answering(token, request);
    await this.quotes.give(token, body);
    return this.life.forLink(token);
  }

  @Post('state')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async mark(
    @Param('token') token: string,
    @Req() request: Request,
    @Body() body: MarkStateDto,
  ): Promise<OrderLifeDto> {
    await this.limits.answering(token, request);
    await this.marks.mark(token, body.to, body.name, body.note ?? '');
    return this.life.forLink(token);
  }

  @Post('questions')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async ask(
    @Param('token') token: string,
    @Req() request: Request,
    @Body() body: AskQuestionDto,
  ): Promise<OrderLifeDto> {
    await this.limits.answering(token, request);
    await this.questions.askByLink(token, body);
    return this.life.forLink(token);
  }

  @Post('questions/:questionId/answer')
  @HttpCode(200)
  @ApiOkResponse({ type: OrderLifeDto })
  async answer(
    @Param('token') token: string,
    @Req() request: Request,
    @IdParam('questionId') questionId: string,
    @Body() body: AnswerQuestionDto,
  ): Promise<OrderLifeDto> {
    await this.limits.answering(token, request);
    await this.questions.answerByLink(token, questionId, body.answer);
    return this.life.forLink(token);
  }
}
