import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { Problem } from '../common/problem';
import type { CushionOrder } from './entities/cushion-order.entity';
import { firstArticleOf } from './order-agreement';
import { OrderActs, type OrderAct } from './order-acts.service';
import { type MarkedState, mayFollow, STATE_WORDS } from './order-states';

const NEWS: Record<MarkedState, string> = {
  'first-article': 'the first article is ready',
  'in-work': 'the batch is in work',
  shipped: 'shipped',
};

/** How far the work has come, as the upholsterer marks it on the private page. */
@Injectable()
export class OrderMarks {
  constructor(private readonly acts: OrderActs) {}

  mark(token: string, to: MarkedState, name: string, note: string): Promise<void> {
    return this.acts.byUpholsterer(token, name, async (act) => {
      await requireMark(act, to);
      const { order, manager } = act;
      const fromState = order.state;
      order.state = to;
      await manager.save(order);
      await act.happened('state', { fromState, note });
      await act.tell({ about: NEWS[to], words: [`${name} says: ${NEWS[to]}.`, note] });
    });
  }
}

async function requireMark(act: OrderAct, to: MarkedState): Promise<void> {
  const { order, manager } = act;
  if (order.state === 'first-article') {
    const article = await firstArticleOf(manager, order);
    // One that was rejected is made anew and shown again.
    if (to === 'first-article' && article === 'rejected') return;
    if (to === 'in-work' && article !== 'accepted') {
      throw Problem.conflict(
        'first-article-not-accepted',
        'The workshop has not accepted the first article yet. The batch waits for that.',
      );
    }
  }
  if (!mayFollow(order.state, to)) {
    throw Problem.conflict(
      'state-not-reachable',
      `An order that is ${STATE_WORDS[order.state]} cannot become ${STATE_WORDS[to]}.`,
    );
  }
}

/** What the upholsterer may mark now. */
export async function marksAfter(manager: EntityManager, order: CushionOrder): Promise<MarkedState[]> {
  const article = order.state === 'first-article' ? await firstArticleOf(manager, order) : null;
  switch (order.state) {
    case 'agreed':
      return ['first-article'];
    case 'first-article':
      return article === 'accepted' ? ['in-work'] : article === 'rejected' ? ['first-article'] : [];
    case 'in-work':
      return ['shipped'];
    default:
      return [];
  }
}
