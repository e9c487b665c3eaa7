import { useId } from 'react';
import { FieldGroup, type FieldProps } from './Field';
import type { Option } from './Select';

type ChoiceProps<Value extends string> = FieldProps & {
  value: Value | '';
  onChange: (value: Value) => void;
  options: readonly Option<Value>[];
  /** Below each other, where the options are sentences. */
  below?: boolean;
};

/** One of a few, all in sight. */
export function Choice<Value extends string>({
  value,
  onChange,
  options,
  below,
  ...field
}: ChoiceProps<Value>) {
  const made = useId();
  const group = field.id ?? made;
  return (
    <FieldGroup {...field} id={group}>
      <div className={`tk-choice${below ? ' tk-choice-below' : ''}`}>
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
