import type { InputHTMLAttributes, Ref, TextareaHTMLAttributes } from 'react';
import { useState } from 'react';
import { classNames } from './class-names.ts';
import { FIELD_LINE, FieldFrame, type FieldWords } from './field-frame.tsx';

type TextFieldProps = FieldWords &
  Omit<InputHTMLAttributes<HTMLInputElement>, 'className'> & { ref?: Ref<HTMLInputElement> };

export function TextField({ label, description, error, optional, className, ...input }: TextFieldProps) {
  return (
    <FieldFrame {...{ label, description, error, optional, className }}>
      {(control) => <input {...input} {...control} className={classNames(FIELD_LINE, 'h-12')} />}
    </FieldFrame>
  );
}

/** A password that can be read back before it is sent. */
export function PasswordField({ label, description, error, optional, className, ...input }: TextFieldProps) {
  const [shown, setShown] = useState(false);
  return (
    <FieldFrame {...{ label, description, error, optional, className }}>
      {(control) => (
        <div className="relative">
          <input
            {...input}
            {...control}
            type={shown ? 'text' : 'password'}
            autoCapitalize="none"
            spellCheck={false}
            className={classNames(FIELD_LINE, 'h-12 pr-16')}
          />
          <button
            type="button"
            className="absolute inset-y-0 right-0 px-3 text-sm text-ink-2 hover:text-ink"
            aria-pressed={shown}
            aria-label={`Show ${label.toLowerCase()}`}
            onClick={() => setShown(!shown)}
          >
            {shown ? 'Hide' : 'Show'}
          </button>
        </div>
      )}
    </FieldFrame>
  );
}

type TextAreaProps = FieldWords &
  Omit<TextareaHTMLAttributes<HTMLTextAreaElement>, 'className'> & { ref?: Ref<HTMLTextAreaElement> };

export function TextArea({
  label,
  description,
  error,
  optional,
  className,
  rows = 3,
  ...input
}: TextAreaProps) {
  return (
    <FieldFrame {...{ label, description, error, optional, className }}>
      {(control) => (
        <textarea
          {...input}
          {...control}
          rows={rows}
          className={classNames(FIELD_LINE, 'min-h-20 py-2.5 leading-6')}
        />
      )}
    </FieldFrame>
  );
}
