import { useState, type Ref } from 'react';
import { text } from '@/shared/text/catalogue';
import { Field, type FieldProps } from './Field';
import { readDecimal } from './read-number';

type MoneyProps = FieldProps & {
  /** A decimal string, or what was typed while it is not one. */
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  currency?: string;
  disabled?: boolean;
  inputRef?: Ref<HTMLInputElement> | undefined;
};

/** An amount or rate as a decimal string; "4,50" is understood. */
export function MoneyInput({ value, onChange, onBlur, currency, disabled, inputRef, ...field }: MoneyProps) {
  const [typed, setTyped] = useState(value);
  const [left, setLeft] = useState(false);
  const shown = readDecimal(typed) === value ? typed : value;
  const misread = left && value !== '' && !/^-?\d+(\.\d+)?$/.test(value);
  const error = field.error ?? (misread ? text.ui.notAnAmount : undefined);
  return (
    <Field {...field} label={currency ? `${field.label} (${currency})` : field.label} error={error}>
      {(ties) => (
        <input
          {...ties}
          ref={inputRef}
          className="tk-input tk-input-figure"
          inputMode="decimal"
          autoComplete="off"
          value={shown}
          disabled={disabled}
          onChange={(event) => {
            setTyped(event.target.value);
            onChange(readDecimal(event.target.value));
          }}
          onBlur={() => {
            setLeft(true);
            onBlur?.();
          }}
        />
      )}
    </Field>
  );
}
