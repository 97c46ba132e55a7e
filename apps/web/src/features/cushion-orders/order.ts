import type { CushionRules, CushionSpec, OrderCover } from '@settlewright/geometry';
import type { OrderState, Paper, RoundTo, UnitSystem } from '@/lib/contract.ts';

/** The words of an order beside its sizes. */
export interface OrderSpec {
  cover: string;
  foam: string;
  welt: string;
  closure: string;
  fixing: string;
  buttons: string;
  notes: string;
  flammability: string;
}

export const SPEC_WORDS: Record<keyof OrderSpec, string> = {
  cover: 'Cover',
  foam: 'Foam, beyond its grade',
  welt: 'Welt',
  closure: 'Closure',
  fixing: 'Fixing',
  buttons: 'Buttons',
  notes: 'Notes, wear and ageing',
  flammability: 'Flammability, required and evidence',
};

export interface Acknowledgement {
  name: string;
  at: string;
  revisionLetter: string;
}

export interface OrderEvent {
  kind: string;
  at: string;
  side: 'workshop' | 'upholsterer';
  byName: string;
  fromState: OrderState | null;
  toState: OrderState | null;
  revisionLetter: string;
  note: string;
}

/** What happened where no new state says it. */
export const EVENT_WORDS: Partial<Record<string, string>> = {
  created: 'Order begun',
  sent: 'Sent',
  acknowledged: 'Can make it as drawn',
  'link-renewed': 'A new private link was mailed',
  'link-revoked': 'The private link was revoked',
  'quote-given': 'Quoted',
  'quote-accepted': 'The quote was accepted',
  'quote-declined': 'The quote was declined',
  'first-article-accepted': 'The first article was accepted',
  'first-article-rejected': 'The first article was rejected',
  'delivery-accepted': 'The delivery was accepted',
  'delivery-rejected': 'The delivery was rejected',
  'deposit-paid': 'A deposit was paid',
  'deposit-recorded': 'A deposit was put down',
  'refund-recorded': 'A refund was put down',
  'mail-bounced': 'A mail came back',
};

export interface OrderMessage {
  id?: string;
  side: 'workshop' | 'upholsterer';
  authorName: string;
  text: string;
  at: string;
}

export interface Order {
  id: string;
  number: number;
  title: string;
  state: OrderState;
  setId: string;
  setName: string;
  revisionLetter: string;
  revisionIssuedAt: string;
  neededBy: string | null;
  cushionMarks: string[] | null;
  upholsterer: { id: string; name: string; contactName: string; removed: boolean } | null;
  openQuestions: number;
  spec: OrderSpec;
  /** How far a finished size may be off. */
  toleranceMm: number;
  /** Its cloths; none as long as nobody said them. */
  covers: OrderCover[];
  /** Allowances and foams that its revision was issued with. */
  cushionRules: CushionRules;
  cushions: CushionSpec[];
  sent: { revisionLetter: string; at: string; byName: string; changedSince: boolean } | null;
  acknowledgement: Acknowledgement | null;
  link: { state: 'none' | 'valid' | 'expired' | 'revoked'; expiresAt: string | null };
  lastMail: { id: string; state: string; at: string } | null;
  nextStates: OrderState[];
  maySend: boolean;
  mayChange: boolean;
  events: OrderEvent[];
}

/** What an upholsterer asks for first and the order does not say, in words. */
export function notSaidYet({
  spec,
  covers,
  neededBy,
}: Pick<Order, 'spec' | 'covers' | 'neededBy'>): string[] {
  return [
    spec.cover.trim() === '' && covers.length === 0 && 'cover',
    spec.welt.trim() === '' && 'welt',
    neededBy === null && 'needed-by date',
  ].filter((words) => words !== false);
}

/** What the holder of a private link sees. */
export interface PublicOrder {
  workshop: { name: string; telephone: string; contactName: string };
  number: number;
  title: string;
  productionName: string;
  setName: string;
  upholstererName: string;
  state: OrderState;
  revisionLetter: string;
  revisionIssuedAt: string;
  neededBy: string | null;
  units: UnitSystem;
  roundTo: RoundTo;
  /** Of the drawing pack, unless another is asked for. */
  paper: Paper;
  sentAt: string;
  spec: OrderSpec;
  cushions: CushionSpec[];
  /** Its cloths, without what the workshop pays for them. */
  covers: OrderCover[];
  messages: OrderMessage[];
  acknowledgement: Acknowledgement | null;
  linkExpiresAt: string;
}
