import type { Ref } from 'react';
import { text } from '@/shared/text/catalogue';
import { Field, FieldGroup, FieldWords, type FieldProps } from './Field';

export type Option<Value extends string = string> = { value: Value; label: string };

type Props = FieldProps & {
  value: string;
  onChange: (value: string) => void;
  onBlur?: () => void;
  options: readonly Option[];
  /** The first entry while nothing is chosen; null leaves it out. */
  placeholder?: string | null;
  disabled?: boolean;
  inputRef?: Ref<HTMLSelectElement> | undefined;
};

/** One of a list: the device's own picker. */
export function Select({
  value,
  onChange,
  onBlur,
  options,
  placeholder = text.ui.choose,
  disabled,
  inputRef,
  ...field
}: Props) {
  return (
    <Field {...field}>
      {(ties) => (
        <div className="tk-select">
          <select
            {...ties}
            ref={inputRef}
            className="tk-input"
            value={value}
            disabled={disabled}
            onChange={(event) => onChange(event.target.value)}
            onBlur={onBlur}
          >
            {placeholder === null ? null : <option value="">{placeholder}</option>}
            {options.map((option) => (
              <option key={option.value} value={option.value}>
                {option.label}
              </option>
            ))}
          </select>
        </div>
      )}
    </Field>
  );
}

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

type CheckboxProps = FieldProps & { value: boolean; onChange: (value: boolean) => void; onBlur?: () => void };

/** Yes or no, with its words beside it. */
export function Checkbox({ label, hint, error, id, value, onChange, onBlur }: CheckboxProps) {
  const own = id ?? `check-${label}`;
  return (
    <div className="tk-field">
      <label className="tk-check">
        <input
          id={own}
          type="checkbox"
          checked={value}
          aria-describedby={error ? `${own}-error` : hint ? `${own}-hint` : undefined}
          aria-invalid={error ? true : undefined}
          onChange={(event) => onChange(event.target.checked)}
          onBlur={onBlur}
        />
        {label}
      </label>
      <FieldWords own={own} hint={hint} error={error} />
    </div>
  );
}

type ChoiceProps<Value extends string> = FieldProps & {
  value: Value | '';
  onChange: (value: Value) => void;
  options: readonly Option<Value>[];
};

/** One of a few, all in sight. */
export function Choice<Value extends string>({ value, onChange, options, ...field }: ChoiceProps<Value>) {
  const group = field.id ?? `choice-${field.label}`;
  return (
    <FieldGroup {...field} id={group}>
      <div className="tk-choice">
        {options.map((option) => (
          <label key={option.value}>
            <input
              type="radio"
              name={group}
              value={option.value}
              checked={value === option.value}
              onChange={() => onChange(option.value)}
            />
            {option.label}
          </label>
        ))}
      </div>
    </FieldGroup>
  );
}
