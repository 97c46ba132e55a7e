import { Injectable } from '@nestjs/common';
import type { MemberInfo } from '../../common/access.decorator';
import { Problem } from '../../common/problem';
import { requireMark } from '../cushion-mark';
import type { OrderPlace } from '../order-access';
import { OrderActs, type OrderAct, ownedBy } from '../order-acts.service';
import { SentCushions } from '../sent-cushions.service';
import { OrderQuestion } from './order-question.entity';
import type { AskQuestionDto } from './question.dto';

/** Questions pinned to a cushion, from either side; the other side answers. */
@Injectable()
export class QuestionsService {
  constructor(
    private readonly acts: OrderActs,
    private readonly cushions: SentCushions,
  ) {}

  ask(member: MemberInfo, place: OrderPlace, dto: AskQuestionDto): Promise<void> {
    return this.acts.byMember(member, place, (act) => this.keep(act, dto));
  }

  askByLink(token: string, dto: AskQuestionDto): Promise<void> {
    return this.acts.byUpholsterer(token, null, (act) => this.keep(act, dto));
  }

  answer(member: MemberInfo, place: OrderPlace, id: string, answer: string): Promise<void> {
    return this.acts.byMember(member, place, (act) => settle(act, id, answer));
  }

  answerByLink(token: string, id: string, answer: string): Promise<void> {
    return this.acts.byUpholsterer(token, null, (act) => settle(act, id, answer));
  }

  private async keep(act: OrderAct, { cushionMark = null, text }: AskQuestionDto): Promise<void> {
    const { manager, order } = act;
    requireMark(await this.cushions.of(order), cushionMark, 'cushionMark');
    const open = { answeredAt: null, answeredById: null };
    await manager.save(manager.create(OrderQuestion, { ...ownedBy(act), cushionMark, text, ...open }));
    await act.audit('question-asked');
    const on = cushionMark ?? 'the order';
    await act.tell({ about: `a question about ${on}`, words: [`${act.byName} asks about ${on}:`, text] });
  }
}

async function settle(act: OrderAct, id: string, answer: string): Promise<void> {
  const { manager, order, side, byId, byName } = act;
  const { upholstererId } = order;
  const question = await manager.findOneBy(OrderQuestion, { id, orderId: order.id, upholstererId });
  if (!question) throw Problem.notFound('question');
  if (question.answeredAt !== null) {
    throw Problem.conflict('question-answered', 'This question was answered meanwhile.');
  }
  if (question.side === side) {
    throw Problem.conflict('own-question', 'This question waits for the other side.');
  }
  const answered = { answer, answeredAt: new Date(), answeredById: byId, answeredByName: byName };
  await manager.update(OrderQuestion, { id }, answered);
  await act.audit('question-answered');
  const on = question.cushionMark ?? 'the order';
  await act.tell({ about: `your question about ${on} is answered`, words: [`“${question.text}”`, answer] });
}
