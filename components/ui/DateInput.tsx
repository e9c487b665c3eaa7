import type { Ref } from 'react';
import { Field, type FieldProps } from './Field';

type DateProps = FieldProps & {
  /** 'YYYY-MM-DD' or ''. */
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  from?: string;
  to?: string;
  /** A whole month ('YYYY-MM') instead of a day. */
  month?: boolean;
  inputRef?: Ref<HTMLInputElement> | undefined;
};

/** A business day (or month): the device's own calendar. */
export function DateInput({ value, onChange, onBlur, from, to, month, inputRef, ...field }: DateProps) {
  return (
    <Field {...field}>
      {(ties) => (
        <input
          {...ties}
          ref={inputRef}
          className="tk-input"
          type={month ? 'month' : 'date'}
          value={value}
          min={from}
          max={to}
          onChange={(event) => onChange(event.target.value)}
          onBlur={onBlur}
        />
      )}
    </Field>
  );
}
