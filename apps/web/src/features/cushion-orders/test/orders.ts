import {
  addPiece,
  cushionRules,
  deriveCushions,
  emptySetDocument,
  NO_OWN_CUSHIONS,
} from '@settlewright/geometry';
import type { OrderLife } from '@/lib/contract.ts';
import type { Order, PublicOrder } from '../order.ts';

export const CUSHIONS = deriveCushions(addPiece(emptySetDocument(), 'bench').document);

const SPEC = {
  ...{ cover: 'Plum moquette', foam: '', welt: '', closure: '', fixing: '', buttons: '' },
  ...{ notes: '', flammability: '' },
};

export const PUBLIC_ORDER: PublicOrder = {
  workshop: { name: 'Ropewalk Scenic', telephone: '555 0142', contactName: 'Nell Abara' },
  number: 1,
  title: 'Dining car, seat cushions',
  productionName: 'Supper at Larch Junction',
  setName: 'Dining car',
  upholstererName: 'Fennimore & Daughter',
  state: 'sent',
  revisionLetter: 'B',
  revisionIssuedAt: '2026-01-28T10:00:00Z',
  neededBy: '2026-02-26',
  units: 'feet-inches',
  roundTo: 8,
  paper: 'letter',
  sentAt: '2026-01-29T09:00:00Z',
  spec: SPEC,
  cushions: CUSHIONS,
  covers: [],
  messages: [],
  acknowledgement: null,
  linkExpiresAt: '2026-04-01T10:00:00Z',
};

export const ORDER: Order = {
  id: '6b1f0c5e-1a0e-4c53-9a55-0a3d6f6f9c01',
  number: 1,
  title: 'Dining car, seat cushions',
  state: 'draft',
  setId: '6b1f0c5e-1a0e-4c53-9a55-0a3d6f6f9d01',
  setName: 'Dining car',
  revisionLetter: 'B',
  revisionIssuedAt: '2026-01-28T10:00:00Z',
  neededBy: null,
  cushionMarks: null,
  upholsterer: null,
  openQuestions: 0,
  spec: SPEC,
  toleranceMm: 6.35,
  covers: [],
  cushionRules: cushionRules(NO_OWN_CUSHIONS),
  cushions: CUSHIONS,
  sent: null,
  acknowledgement: null,
  link: { state: 'none', expiresAt: null },
  lastMail: null,
  nextStates: ['cancelled'],
  maySend: true,
  mayChange: true,
  events: [],
};

export const SENT_ORDER: Order = {
  ...ORDER,
  state: 'sent',
  upholsterer: { id: 'u9', name: 'Fennimore & Daughter', contactName: 'Odile Fennimore', removed: false },
  sent: { revisionLetter: 'B', at: '2026-01-29T09:00:00Z', byName: 'Nell Abara', changedSince: false },
  link: { state: 'valid', expiresAt: '2026-04-01T10:00:00Z' },
  lastMail: { id: 'm1', state: 'failed', at: '2026-01-29T09:00:00Z' },
  nextStates: ['quoted', 'cancelled'],
};

export const LIFE: OrderLife = {
  toleranceMm: 6.35,
  earlierRevision: null,
  changes: [],
  agreement: { upholsterer: null, workshop: null },
  firstArticle: 'none',
  delivery: 'none',
  upholstererMayMark: [],
  upholstererMayQuote: true,
  quotes: [],
  questions: [],
  inspections: [],
  files: [],
  payments: [],
  depositOnline: false,
  mails: [],
};

export const QUOTE: OrderLife['quotes'][number] = {
  id: 'q1',
  side: 'upholsterer',
  byName: 'Odile Fennimore',
  at: '2026-02-02T09:00:00Z',
  current: true,
  revisionLetter: 'B',
  lines: [{ text: 'Seat cushion', quantity: 4, unitMinor: 46_500 }],
  currency: 'USD',
  taxText: '',
  taxMinor: 0,
  totalMinor: 186_000,
  validUntil: '2099-02-19',
  deliveryOn: null,
  note: '',
  state: 'offered',
  inForce: true,
  answeredAt: null,
  answeredByName: '',
  answer: '',
};
