import { describe, expect, it } from '@jest/globals';
import { mayFollow, maySend, ORDER_STATES, type OrderState, recordableAfter } from './order-states';

const LINE: OrderState[] = [
  'draft',
  'sent',
  'quoted',
  'agreed',
  'first-article',
  'in-work',
  'shipped',
  'received',
  'closed',
];

describe('states of an order', () => {
  it('go forward one step at a time and never back', () => {
    for (const [i, from] of LINE.entries()) {
      for (const [j, to] of LINE.entries())
        expect([from, to, mayFollow(from, to)]).toEqual([from, to, j === i + 1]);
    }
  });

  it('can be cancelled from every state before shipped, and from none after', () => {
    const from = ORDER_STATES.filter((state) => mayFollow(state, 'cancelled'));
    expect(from).toEqual(['draft', 'sent', 'quoted', 'agreed', 'first-article', 'in-work']);
  });

  it('never lets "sent" be recorded without a mail', () => {
    expect(recordableAfter('draft')).toEqual(['cancelled']);
  });

  it('end with closed or cancelled', () => {
    expect(recordableAfter('closed')).toEqual([]);
    expect(recordableAfter('cancelled')).toEqual([]);
  });

  it('may be sent again only before work has begun', () => {
    expect(ORDER_STATES.filter(maySend)).toEqual(['draft', 'sent', 'quoted', 'agreed']);
  });
});
