import type { ButtonHTMLAttributes, ReactNode, Ref } from 'react';
import { Link } from 'react-router-dom';
import { classNames } from './class-names.ts';

type Look = 'main' | 'ruled' | 'word';
type Size = 'normal' | 'small';

interface Shared {
  look?: Look;
  size?: Size;
  icon?: ReactNode;
  children: ReactNode;
}

const LOOKS: Record<Look, string> = {
  main: 'border-chalk bg-chalk text-on-chalk hover:border-chalk-deep hover:bg-chalk-deep',
  ruled: 'border-rule-strong bg-transparent text-ink hover:border-ink hover:bg-sunk',
  word: '',
};

function classes({ look = 'ruled', size = 'normal' }: Pick<Shared, 'look' | 'size'>, more?: string): string {
  if (look === 'word') {
    return classNames(
      'link reach inline-flex min-h-6 items-center gap-1.5 py-0.5 text-sm disabled:text-ink-3',
      more,
    );
  }
  return classNames(
    'quick inline-flex items-center justify-center gap-2 rounded-sm border-[1.25px] font-medium leading-tight no-underline',
    'aria-disabled:cursor-default aria-disabled:opacity-60 disabled:cursor-not-allowed disabled:opacity-60',
    size === 'small' ? 'min-h-9 px-3.5 py-1.5 text-sm max-tablet:min-h-10' : 'min-h-11 px-5 py-2 text-base',
    LOOKS[look],
    more,
  );
}

interface ButtonProps extends Shared, Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'children'> {
  /** Work is under way: the button keeps the focus but does not act again. */
  busy?: boolean;
  busyWords?: string;
  ref?: Ref<HTMLButtonElement>;
}

/** A filled button for the step that matters, ruled ones for the rest, words for small things. */
export function Button({
  look,
  size,
  icon,
  busy = false,
  busyWords,
  children,
  className,
  onClick,
  type = 'button',
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={type}
      aria-disabled={busy || undefined}
      className={classes({ look, size }, className)}
      onClick={(event) => {
        if (busy) event.preventDefault();
        else onClick?.(event);
      }}
    >
      {icon}
      {busy && busyWords ? busyWords : children}
    </button>
  );
}

interface LinkButtonProps extends Shared {
  to: string;
  className?: string;
}

export function LinkButton({ look, size, icon, to, children, className }: LinkButtonProps) {
  return (
    <Link to={to} className={classes({ look, size }, className)}>
      {icon}
      {children}
    </Link>
  );
}
