import { useId, type ReactNode } from 'react';
import { text } from '@/shared/text/catalogue';

export type FieldProps = {
  label: string;
  hint?: string | undefined;
  error?: string | undefined;
  optional?: boolean;
  /** The label stays for screen readers alone, where the place on the page says it already. */
  hideLabel?: boolean;
  id?: string;
};

type Ties = {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
};

/** Ties label, hint and error to the input that `children` draws. */
export function Field({
  label,
  hint,
  error,
  optional,
  hideLabel,
  id,
  children,
}: FieldProps & { children: (ties: Ties) => ReactNode }) {
  const made = useId();
  const own = id ?? made;
  const described = [hint && `${own}-hint`, error && `${own}-error`].filter(Boolean).join(' ');
  return (
    <div className="tk-field">
      <label htmlFor={own} className={hideLabel ? 'tk-hidden' : 'tk-label'}>
        {label}
        {optional ? <span className="tk-label-soft">, {text.ui.optional}</span> : null}
      </label>
      {children({
        id: own,
        'aria-describedby': described || undefined,
        'aria-invalid': error ? true : undefined,
      })}
      <FieldWords own={own} hint={hint} error={error} />
    </div>
  );
}

/** Hint and error below an input. */
export function FieldWords({
  own,
  hint,
  error,
}: {
  own: string;
  hint?: string | undefined;
  error?: string | undefined;
}) {
  return (
    <>
      {hint ? (
        <span id={`${own}-hint`} className="tk-hint">
          {hint}
        </span>
      ) : null}
      {error ? (
        <span id={`${own}-error`} className="tk-error">
          {error}
        </span>
      ) : null}
    </>
  );
}

/** The same for a group of inputs: fieldset and legend. */
export function FieldGroup({
  label,
  hint,
  error,
  hideLabel,
  id,
  children,
}: FieldProps & { children: ReactNode }) {
  const made = useId();
  const own = id ?? made;
  const described = [hint && `${own}-hint`, error && `${own}-error`].filter(Boolean).join(' ');
  return (
    <fieldset className="tk-field" id={own} tabIndex={-1} aria-describedby={described || undefined}>
      <legend className={hideLabel ? 'tk-hidden' : 'tk-label'}>{label}</legend>
      {children}
      <FieldWords own={own} hint={hint} error={error} />
    </fieldset>
  );
}
