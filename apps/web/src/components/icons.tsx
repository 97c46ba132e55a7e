import type { ReactNode } from 'react';

function Icon({ children, size = 20 }: { children: ReactNode; size?: number }) {
  return (
    <svg
      viewBox="0 0 20 20"
      width={size}
      height={size}
      fill="none"
      stroke="currentColor"
      strokeWidth="1.5"
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
      focusable="false"
      className="shrink-0"
    >
      {children}
    </svg>
  );
}

export const AddIcon = () => (
  <Icon>
    <path d="M10 3.5v13M3.5 10h13" />
  </Icon>
);

export const CloseIcon = () => (
  <Icon>
    <path d="m5 5 10 10M15 5 5 15" />
  </Icon>
);

export const OpenIcon = () => (
  <Icon size={16}>
    <path d="m5 8 5 5 5-5" />
  </Icon>
);

export const TickIcon = () => (
  <Icon size={16}>
    <path d="m4 10.5 4 4 8-9" />
  </Icon>
);

export const SearchIcon = () => (
  <Icon>
    <circle cx="8.75" cy="8.75" r="5.25" />
    <path d="m12.75 12.75 4 4" />
  </Icon>
);

export const MoreIcon = () => (
  <Icon>
    <path d="M4 10h.01M10 10h.01M16 10h.01" strokeWidth="2.5" />
  </Icon>
);

export const SortIcon = ({ direction }: { direction: 'asc' | 'desc' | false }) => (
  <Icon size={12}>
    {direction === 'asc' && <path d="M10 17V3M4 9l6-6 6 6" strokeWidth="2.2" />}
    {direction === 'desc' && <path d="M10 3v14M4 11l6 6 6-6" strokeWidth="2.2" />}
    {direction === false && <path d="m6 7 4-4 4 4M6 13l4 4 4-4" strokeWidth="1.8" opacity="0.55" />}
  </Icon>
);
