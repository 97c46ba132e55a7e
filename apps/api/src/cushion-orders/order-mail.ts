import type { MailToSend } from '../mail/mail.service';

/** Mails that go to the upholsterer. */
export const OUTGOING_KINDS = [
  'cushion-order',
  'cushion-order-link',
  'cushion-order-message',
  'cushion-order-news',
  'cushion-order-cancelled',
] as const;

export interface OrderLetter {
  workshopName: string;
  workshopTelephone: string;
  senderName: string;
  senderEmail: string;
  upholstererName: string;
  upholstererEmail: string;
  contactName: string;
  number: number;
  title: string;
  revisionLetter: string;
  /** A day in words, or nothing. */
  neededBy: string | null;
  cushionCount: number;
  linkUrl: string;
  linkExpires: string;
  message: string;
}

const cushions = (count: number) => (count === 1 ? 'one cushion' : `${count} cushions`);

function greeting(letter: { contactName: string; upholstererName: string }): string {
  return `Dear ${letter.contactName || letter.upholstererName},`;
}

function signature(letter: LastLetter): string {
  return [letter.senderName, letter.workshopName, letter.workshopTelephone].filter(Boolean).join('\n');
}

function linkWords(letter: OrderLetter): string {
  return [
    'The order, your questions and our answers are on this page:',
    letter.linkUrl,
    `The link is yours alone and works until ${letter.linkExpires}. Please do not pass it on.`,
  ].join('\n');
}

/** The order itself, with its drawing pack. */
export function orderMail(letter: OrderLetter, pack: { filename: string; content: Buffer }): MailToSend {
  const needed = letter.neededBy ? ` We need them by ${letter.neededBy}.` : '';
  const opening =
    `Here is cushion order ${letter.number}, “${letter.title}”, revision ${letter.revisionLetter}: ` +
    `${cushions(letter.cushionCount)}.${needed} The drawing pack is attached; sizes are finished, seam to seam.`;
  return {
    to: letter.upholstererEmail,
    replyTo: letter.senderEmail,
    kind: 'cushion-order',
    subject: `Cushion order ${letter.number} from ${letter.workshopName}: ${letter.title}, revision ${letter.revisionLetter}`,
    text: paragraphs([greeting(letter), letter.message, opening, linkWords(letter), signature(letter)]),
    attachments: [{ ...pack, contentType: 'application/pdf' }],
  };
}

/** The same order under a new link. */
export function renewedLinkMail(letter: OrderLetter): MailToSend {
  const words = `Here is a new link to cushion order ${letter.number}, “${letter.title}”. Earlier links no longer work.`;
  return {
    to: letter.upholstererEmail,
    replyTo: letter.senderEmail,
    kind: 'cushion-order-link',
    subject: `New link to cushion order ${letter.number} from ${letter.workshopName}`,
    text: paragraphs([greeting(letter), words, linkWords(letter), signature(letter)]),
  };
}

/** A message of the workshop in the thread of the order. */
export function workshopMessageMail(letter: OrderLetter): MailToSend {
  return {
    to: letter.upholstererEmail,
    replyTo: letter.senderEmail,
    kind: 'cushion-order-message',
    subject: `Cushion order ${letter.number} from ${letter.workshopName}: a message`,
    text: paragraphs([greeting(letter), letter.message, linkWords(letter), signature(letter)]),
  };
}

export interface UpholstererNews {
  to: string;
  recipientName: string;
  upholstererName: string;
  number: number;
  title: string;
  orderUrl: string;
}

/** Something that happened to an order, as the other side is told. */
export interface News {
  /** ends the subject: "the quote is accepted" */
  about: string;
  /** paragraphs */
  words: readonly string[];
}

export function newsForUpholsterer(letter: OrderLetter, { about, words }: News): MailToSend {
  return {
    to: letter.upholstererEmail,
    replyTo: letter.senderEmail,
    kind: 'cushion-order-news',
    subject: `Cushion order ${letter.number} from ${letter.workshopName}: ${about}`,
    text: paragraphs([greeting(letter), ...words, linkWords(letter), signature(letter)]),
  };
}

export function newsForWorkshop(news: UpholstererNews, { about, words }: News): MailToSend {
  return {
    to: news.to,
    kind: 'cushion-order-progress',
    subject: `Cushion order ${news.number}: ${about}`,
    text: paragraphs([
      `Dear ${news.recipientName},`,
      `About cushion order ${news.number}, “${news.title}”, with ${news.upholstererName}:`,
      ...words,
      `The order:\n${news.orderUrl}`,
    ]),
  };
}

export function replyMail(news: UpholstererNews, text: string): MailToSend {
  return {
    to: news.to,
    kind: 'cushion-order-reply',
    subject: `Cushion order ${news.number}: ${news.upholstererName} wrote`,
    text: paragraphs([
      `Dear ${news.recipientName},`,
      `${news.upholstererName} wrote about cushion order ${news.number}, “${news.title}”:`,
      text,
      `Answer here:\n${news.orderUrl}`,
    ]),
  };
}

export function acknowledgedMail(
  news: UpholstererNews,
  { name, revisionLetter, agreed }: { name: string; revisionLetter: string; agreed: boolean },
): MailToSend {
  return {
    to: news.to,
    kind: 'cushion-order-acknowledged',
    subject: `Cushion order ${news.number}: ${news.upholstererName} can make it as drawn`,
    text: paragraphs([
      `Dear ${news.recipientName},`,
      `${name} of ${news.upholstererName} can make cushion order ${news.number}, “${news.title}”, ` +
        `as revision ${revisionLetter} is drawn.`,
      agreed ? `You accepted the quote for it, so revision ${revisionLetter} is agreed.` : '',
      `The order:\n${news.orderUrl}`,
    ]),
  };
}

/** What a last word about an order says of it: there is no page to look at any more. */
type LastLetter = Omit<
  OrderLetter,
  'linkUrl' | 'linkExpires' | 'message' | 'revisionLetter' | 'neededBy' | 'cushionCount'
>;

export function lastLetter(
  workshop: { name: string; telephone: string },
  sender: { name: string; email: string },
  told: { name: string; email: string; contactName: string },
  { number, title }: { number: number; title: string },
): LastLetter {
  return {
    workshopName: workshop.name,
    workshopTelephone: workshop.telephone,
    senderName: sender.name,
    senderEmail: sender.email,
    upholstererName: told.name,
    upholstererEmail: told.email,
    contactName: told.contactName,
    number,
    title,
  };
}

/** That an order is called off. */
export function cancelledMail(letter: LastLetter): MailToSend {
  return lastMail(letter, 'cushion-order-cancelled', 'is cancelled');
}

/** That an order goes to somebody else; to whom is no business of the one who loses it. */
export function withdrawnMail(letter: LastLetter): MailToSend {
  return lastMail(letter, 'cushion-order-withdrawn', 'is withdrawn');
}

function lastMail(letter: LastLetter, kind: string, happened: string): MailToSend {
  const words = `Cushion order ${letter.number}, “${letter.title}”, ${happened}. Please stop any work on it.`;
  return {
    to: letter.upholstererEmail,
    replyTo: letter.senderEmail,
    kind,
    subject: `Cushion order ${letter.number} from ${letter.workshopName} ${happened}`,
    text: paragraphs([greeting(letter), words, signature(letter)]),
  };
}

function paragraphs(parts: readonly string[]): string {
  return `${parts.filter((part) => part !== '').join('\n\n')}\n`;
}
