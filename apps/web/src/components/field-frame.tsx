import type { ReactNode } from 'react';
import { useId } from 'react';
import { classNames } from './class-names.ts';

export interface FieldWords {
  label: string;
  /** A quiet sentence under the field. */
  description?: ReactNode;
  /** What was wrong, in words; takes the place of nothing and stands under the field. */
  error?: string;
  /** Said behind the label: "(optional)", or "(if known)" for what somebody has to have measured. */
  optional?: boolean | 'if known';
  className?: string;
}

export interface ControlProps {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
}

/** The line a field sits on: chalk when it has the focus, brick when it could not be read. */
export const FIELD_LINE =
  'quick block w-full rounded-t-sm border-0 border-b-[1.5px] border-rule-strong bg-sheet px-3 in-[[role=dialog]]:bg-paper text-[1.0625rem] text-ink ' +
  'hover:border-ink focus:border-chalk focus:bg-chalk-wash focus:shadow-[inset_0_-1.5px_0_var(--color-chalk)] focus:outline-2 focus:outline-transparent ' +
  'aria-invalid:border-wont aria-invalid:bg-wont-wash aria-invalid:shadow-[inset_0_-1.5px_0_var(--color-wont)] ' +
  'disabled:border-rule disabled:bg-transparent disabled:text-ink-2';

/** Label above, description and error below, wired for a screen reader. */
export function FieldFrame({
  label,
  description,
  error,
  optional,
  className,
  children,
}: FieldWords & { children: (control: ControlProps) => ReactNode }) {
  const id = useId();
  const describedBy = [error && `${id}-error`, description && `${id}-about`].filter(Boolean).join(' ');
  return (
    <div className={classNames('min-w-0', className)}>
      <label htmlFor={id} className="mb-1 block text-sm font-medium">
        {label}
        {optional && (
          <span className="font-normal text-ink-3"> ({optional === true ? 'optional' : optional})</span>
        )}
      </label>
      {children({
        id,
        'aria-describedby': describedBy || undefined,
        'aria-invalid': error ? true : undefined,
      })}
      {error && (
        <p id={`${id}-error`} className="mt-1.5 text-sm font-medium text-wont">
          {error}
        </p>
      )}
      {description && (
        <div id={`${id}-about`} className="mt-1.5 text-sm text-ink-3">
          {description}
        </div>
      )}
    </div>
  );
}
