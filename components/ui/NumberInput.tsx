import { useState, type Ref } from 'react';
import { text } from '@/shared/text/catalogue';
import { Field, type FieldProps } from './Field';
import { readWhole } from './read-number';

/** A number once it is understood; the text itself while it is not; null while empty. */
export type TypedNumber = number | string | null;

type Props = FieldProps & {
  value: TypedNumber;
  onChange: (value: TypedNumber) => void;
  onBlur?: () => void;
  /** Buttons for one fewer and one more. */
  steps?: boolean;
  /** For gloves: 64 px tall, figures of 26 px. */
  large?: boolean;
  least?: number;
  disabled?: boolean;
  inputRef?: Ref<HTMLInputElement> | undefined;
};

const asTyped = (value: TypedNumber) => (value === null ? '' : String(value));

type Reading = Pick<Props, 'value' | 'onChange'> & { least: number };

/** Keeps what was typed beside what it was read as, so that "1 234" stays as the person wrote it. */
function useTyped({ value, onChange, least }: Reading) {
  const [typed, setTyped] = useState(asTyped(value));
  const change = (next: TypedNumber, as: string) => {
    setTyped(as);
    onChange(next);
  };
  return {
    shown: readWhole(typed) === value ? typed : asTyped(value),
    type: (as: string) => change(readWhole(as), as),
    step: (by: 1 | -1) => {
      const next = Math.max(least, (typeof value === 'number' ? value : 0) + by);
      change(next, String(next));
    },
  };
}

/** A whole number. Pasted "1 234" is understood; what is not understood stays and says so. */
export function NumberInput({ value, onChange, onBlur, steps, large, least = 0, ...rest }: Props) {
  const { disabled, inputRef, ...field } = rest;
  const [left, setLeft] = useState(false);
  const { shown, type, step } = useTyped({ value, onChange, least });
  const misread = left && typeof value === 'string' && value.trim() !== '';
  const error = field.error ?? (misread ? text.ui.notANumber : undefined);
  return (
    <Field {...field} error={error}>
      {(ties) => (
        <div className="tk-row">
          <input
            {...ties}
            ref={inputRef}
            className={`tk-input tk-input-figure${large ? ' tk-input-large' : ''}`}
            inputMode="numeric"
            autoComplete="off"
            value={shown}
            disabled={disabled}
            onFocus={(event) => event.target.select()}
            onChange={(event) => type(event.target.value)}
            onBlur={() => {
              setLeft(true);
              onBlur?.();
            }}
          />
          {steps ? <Steps label={field.label} large={large} disabled={disabled} step={step} /> : null}
        </div>
      )}
    </Field>
  );
}

type StepsProps = {
  label: string;
  large: boolean | undefined;
  disabled: boolean | undefined;
  step: (by: 1 | -1) => void;
};

function Steps({ label, large, disabled, step }: StepsProps) {
  const look = `tk-step${large ? ' tk-step-large' : ''}`;
  return (
    <>
      <button
        type="button"
        className={look}
        disabled={disabled}
        aria-label={text.ui.oneFewer(label)}
        onClick={() => step(-1)}
      >
        −
      </button>
      <button
        type="button"
        className={look}
        disabled={disabled}
        aria-label={text.ui.oneMore(label)}
        onClick={() => step(1)}
      >
        +
      </button>
    </>
  );
}
