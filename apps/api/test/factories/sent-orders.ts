import { mailedToken } from './mails';
import type { IssuedSet } from './orders';
import { as } from './people';
import type { TestApp } from '../test-app';

/** An order that an upholsterer has. */
export interface SentTo {
  id: string;
  /** /workshops/…/orders/… */
  path: string;
  token: string;
  email: string;
  upholstererId: string;
  cushion: { mark: string; finishedMm: { widthMm: number; depthMm: number; thicknessMm: number } };
}

export interface LifeBody {
  quotes: { id: string; state: string }[];
  questions: { id: string }[];
  inspections: unknown[];
  files: { id: string; name: string; type: string; byName: string }[];
  payments: { id: string; state: string; kind: string; amountMinor: number }[];
  changes: unknown[];
  agreement: unknown;
  earlierRevision: string | null;
  firstArticle: string;
  upholstererMayMark: string[];
}

/** Sends orders of one issued set, each to a firm of its own. */
export class SentOrders {
  private count = 0;

  constructor(
    private readonly test: TestApp,
    private readonly made: IssuedSet,
  ) {}

  async send(firm: object = {}): Promise<SentTo> {
    const owner = as(this.test, this.made.workshop.owner);
    const email = `firm-${++this.count}@cushions.test`;
    const order = await owner
      .post(this.made.orders)
      .send({
        ...{ setId: this.made.setId, revisionLetter: 'A', title: `Seats ${this.count}` },
        spec: { cover: 'plum moquette' },
      })
      .expect(201);
    const { id, cushions } = order.body as { id: string; cushions: SentTo['cushion'][] };
    const path = `${this.made.orders}/${id}`;
    const upholstererId = await this.firm(email, firm);
    await owner.post(`${path}/send`).send({ upholstererId }).expect(200);
    const token = await mailedToken(this.test, email, 'cushion-order');
    return { id, path, token, email, upholstererId, cushion: cushions[0]! };
  }

  /** The token of the second firm that an order is sent to. */
  async sendOn({ path }: SentTo): Promise<string> {
    const email = `firm-${++this.count}@cushions.test`;
    const upholstererId = await this.firm(email);
    await as(this.test, this.made.workshop.owner).post(`${path}/send`).send({ upholstererId }).expect(200);
    return mailedToken(this.test, email, 'cushion-order');
  }

  async sentAt({ token }: SentTo): Promise<string> {
    const { body } = await as(this.test, null).get(`/link/${token}`).expect(200);
    return (body as { sentAt: string }).sentAt;
  }

  private async firm(email: string, more: object = {}): Promise<string> {
    const { body } = await as(this.test, this.made.workshop.owner)
      .post(`/workshops/${this.made.workshop.id}/upholsterers`)
      .send({ name: `Firm ${this.count}`, contactName: 'Odile Fennimore', email, ...more })
      .expect(201);
    return (body as { id: string }).id;
  }
}
