import { useId } from 'react';
import { FieldWords, type FieldProps } from './Field';

type CheckboxProps = FieldProps & { value: boolean; onChange: (value: boolean) => void; onBlur?: () => void };

/** Yes or no, with its words beside it. */
export function Checkbox({ label, hint, error, id, value, onChange, onBlur }: CheckboxProps) {
  const made = useId();
  const own = id ?? made;
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
