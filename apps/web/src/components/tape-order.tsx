import type { OrderState } from '@/lib/contract.ts';
import { classNames } from './class-names.ts';

/** The nine ticks of an order. */
export const ORDER_TICKS: readonly { state: OrderState; words: string }[] = [
  { state: 'draft', words: 'Draft' },
  { state: 'sent', words: 'Sent' },
  { state: 'quoted', words: 'Quoted' },
  { state: 'agreed', words: 'Agreed' },
  { state: 'first-article', words: 'First article' },
  { state: 'in-work', words: 'In work' },
  { state: 'shipped', words: 'Shipped' },
  { state: 'received', words: 'Received' },
  { state: 'closed', words: 'Closed' },
];

export function orderStateWords(state: OrderState): string {
  return ORDER_TICKS.find((tick) => tick.state === state)?.words ?? 'Cancelled';
}

interface TapeOrderProps {
  state: OrderState;
  /** With the nine words under the ticks. */
  labelled?: boolean;
  className?: string;
}

/** How far an order has come, drawn as a tape with nine ticks. Nobody can change it here, so it is ink. */
export function TapeOrder({ state, labelled = false, className }: TapeOrderProps) {
  const at = ORDER_TICKS.findIndex((tick) => tick.state === state);
  const share = at < 0 ? 0 : at / (ORDER_TICKS.length - 1);
  return (
    <div
      role="img"
      aria-label={at < 0 ? 'Cancelled' : `${orderStateWords(state)}, step ${at + 1} of ${ORDER_TICKS.length}`}
      className={classNames('tape', className)}
    >
      <div className="relative mx-0.5 h-5">
        <div className="absolute inset-x-0 bottom-0 h-[1.5px] bg-rule-strong" />
        {at >= 0 && (
          <div
            className="absolute bottom-[-0.75px] left-0 h-[3px] bg-ink"
            style={{ width: `${share * 100}%` }}
          />
        )}
        {ORDER_TICKS.map((tick, index) => (
          <div
            key={tick.state}
            className={classNames(
              'absolute bottom-0 -translate-x-1/2',
              index === at
                ? 'h-[18px] w-[3px] bg-ink'
                : index < at
                  ? 'h-3 w-[1.5px] bg-ink'
                  : 'h-2.5 w-[1.5px] bg-rule-strong',
            )}
            style={{ left: `${(index / (ORDER_TICKS.length - 1)) * 100}%` }}
          />
        ))}
      </div>
      {labelled && (
        <div className="mt-1.5 hidden justify-between text-sm tablet:flex" aria-hidden="true">
          {ORDER_TICKS.map((tick, index) => (
            <span
              key={tick.state}
              className={index === at ? 'font-semibold' : index < at ? 'text-ink' : 'text-ink-3'}
            >
              {tick.words}
            </span>
          ))}
        </div>
      )}
    </div>
  );
}
