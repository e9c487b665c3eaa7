import type { Ref } from 'react';
import { Field, type FieldProps } from './Field';

type Props = FieldProps & {
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  type?: 'text' | 'email' | 'password' | 'search' | 'tel' | 'url';
  autoComplete?: string;
  inputMode?: 'text' | 'numeric' | 'decimal' | 'email';
  disabled?: boolean;
  placeholder?: string;
  inputRef?: Ref<HTMLInputElement> | undefined;
  maxLength?: number;
};

/** One line of text. */
export function TextInput({ value, onChange, onBlur, type = 'text', inputRef, ...rest }: Props) {
  const { autoComplete, inputMode, disabled, placeholder, maxLength, ...field } = rest;
  return (
    <Field {...field}>
      {(ties) => (
        <input
          {...ties}
          ref={inputRef}
          className="tk-input"
          type={type}
          value={value}
          onChange={(event) => onChange(event.target.value)}
          onBlur={onBlur}
          autoComplete={autoComplete}
          inputMode={inputMode}
          disabled={disabled}
          placeholder={placeholder}
          maxLength={maxLength}
        />
      )}
    </Field>
  );
}

type AreaProps = FieldProps & {
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  rows?: number;
  inputRef?: Ref<HTMLTextAreaElement> | undefined;
  maxLength?: number;
};

/** Several lines of text. */
export function TextArea({ value, onChange, onBlur, rows = 4, inputRef, maxLength, ...field }: AreaProps) {
  return (
    <Field {...field}>
      {(ties) => (
        <textarea
          {...ties}
          ref={inputRef}
          className="tk-input"
          rows={rows}
          value={value}
          onChange={(event) => onChange(event.target.value)}
          onBlur={onBlur}
          maxLength={maxLength}
        />
      )}
    </Field>
  );
}
