import { dayWords } from '@/lib/dates.ts';
import type { OrderMessage } from '../order.ts';

/** What was written, oldest first. */
export function Thread({ messages, own }: { messages: readonly OrderMessage[]; own: OrderMessage['side'] }) {
  if (messages.length === 0) return <p className="py-3 text-sm text-ink-2">Nothing was written yet.</p>;
  return (
    <ol aria-label="Messages">
      {messages.map((message, index) => (
        <li key={message.id ?? index} className="border-b border-rule py-2.5">
          <p className="flex justify-between gap-4 text-sm">
            <b className="font-semibold">{message.side === own ? 'You' : message.authorName}</b>
            <time dateTime={message.at} className="text-ink-2">
              {dayWords(message.at)}
            </time>
          </p>
          <p className="break-words whitespace-pre-line">{message.text}</p>
        </li>
      ))}
    </ol>
  );
}
