import type { Ref } from 'react';
import { text } from '@/shared/text/catalogue';
import { Field, type FieldProps } from './Field';

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
