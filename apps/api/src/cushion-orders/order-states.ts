export const ORDER_STATES = [
  'draft',
  'sent',
  'quoted',
  'agreed',
  'first-article',
  'in-work',
  'shipped',
  'received',
  'closed',
  'cancelled',
] as const;
export type OrderState = (typeof ORDER_STATES)[number];

/** States that somebody in the workshop may record; sending has its own route, since it mails. */
export const RECORDED_STATES = [
  'quoted',
  'agreed',
  'first-article',
  'in-work',
  'shipped',
  'received',
  'closed',
  'cancelled',
] as const satisfies readonly OrderState[];
export type RecordedState = (typeof RECORDED_STATES)[number];

/** States that the upholsterer marks on the private page; quoting and agreeing have routes of their own. */
export const MARKED_STATES = ['first-article', 'in-work', 'shipped'] as const satisfies readonly OrderState[];
export type MarkedState = (typeof MARKED_STATES)[number];

const NEXT: Record<OrderState, readonly OrderState[]> = {
  draft: ['sent', 'cancelled'],
  sent: ['quoted', 'cancelled'],
  quoted: ['agreed', 'cancelled'],
  agreed: ['first-article', 'cancelled'],
  'first-article': ['in-work', 'cancelled'],
  'in-work': ['shipped', 'cancelled'],
  shipped: ['received'],
  received: ['closed'],
  closed: [],
  cancelled: [],
};

/** Sent again, the order asks for a new quote: what was agreed concerned another paper. */
const SENDABLE: ReadonlySet<OrderState> = new Set(['draft', 'sent', 'quoted', 'agreed']);

/** What the order says may change until the first article is made. */
const CHANGEABLE: ReadonlySet<OrderState> = SENDABLE;

/** Nothing more is expected from the other side. */
const OVER: ReadonlySet<OrderState> = new Set(['closed', 'cancelled']);

export const STATE_WORDS: Record<OrderState, string> = {
  draft: 'draft',
  sent: 'sent',
  quoted: 'quoted',
  agreed: 'agreed',
  'first-article': 'first article',
  'in-work': 'in work',
  shipped: 'shipped',
  received: 'received',
  closed: 'closed',
  cancelled: 'cancelled',
};

export const mayFollow = (from: OrderState, to: OrderState): boolean => NEXT[from].includes(to);

/** States that can be recorded next, without sending. */
export function recordableAfter(from: OrderState): RecordedState[] {
  return RECORDED_STATES.filter((to) => mayFollow(from, to));
}

/** While nothing is agreed, the upholsterer may name a price, or another. */
export const mayQuote = (state: OrderState): boolean => state === 'sent' || state === 'quoted';

export const maySend = (state: OrderState): boolean => SENDABLE.has(state);
export const mayChange = (state: OrderState): boolean => CHANGEABLE.has(state);
export const isOver = (state: OrderState): boolean => OVER.has(state);
