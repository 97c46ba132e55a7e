import type { ReactNode } from 'react';

interface EmptyStateProps {
  title: string;
  children: ReactNode;
  /** One filled button, and at most one ruled one. */
  actions?: ReactNode;
  /** Dashed outline of what will be there. */
  drawing?: ReactNode;
}

/** Nothing here yet: the dashed outline of it, one sentence, one step. */
export function EmptyState({ title, children, actions, drawing }: EmptyStateProps) {
  return (
    <div className="py-6">
      {drawing && <div className="mb-4 text-rule-strong">{drawing}</div>}
      <p className="text-xl font-light tracking-hero">{title}</p>
      <div className="mt-1 max-w-text text-ink-2">{children}</div>
      {actions && <div className="mt-5 flex flex-wrap gap-3">{actions}</div>}
    </div>
  );
}

/** A bench and a table still to come. */
export function DashedBay() {
  return (
    <svg
      viewBox="0 0 220 132"
      width="220"
      height="132"
      fill="none"
      aria-hidden="true"
      className="tape max-w-full"
    >
      <g stroke="currentColor" strokeWidth="1.5" strokeDasharray="5 4">
        <path d="M14 18 26 84h44v-9H29.4L20 18ZM30 84v36h34V84M60 120v-6" />
        <path d="M206 18 194 84h-44v-9h40.6L200 18ZM190 84v36h-34V84M160 120v-6" />
        <path d="M84 58h52v6H84ZM106 64v50M114 64v50M96 114h28v6H96Z" />
      </g>
      <path d="M4 120.8h212" stroke="var(--color-ink)" strokeWidth="1.5" />
    </svg>
  );
}

/** Names on a list still to come. */
export function DashedList() {
  return (
    <svg
      viewBox="0 0 220 92"
      width="220"
      height="92"
      fill="none"
      aria-hidden="true"
      className="tape max-w-full"
    >
      <g stroke="currentColor" strokeWidth="1.5" strokeDasharray="5 4">
        {[16, 46, 76].map((y) => (
          <path key={y} d={`M6 ${y + 6}v-6a6 6 0 0 1 12 0v6ZM32 ${y}h96M182 ${y}h32`} />
        ))}
      </g>
      <path d="M4 1.5h212" stroke="var(--color-ink)" strokeWidth="1.5" />
    </svg>
  );
}
