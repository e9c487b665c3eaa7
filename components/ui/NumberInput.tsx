import { useState, type Ref } from 'react';
import { text } from '@/shared/text/catalogue';
import { Field, type FieldProps } from './Field';
import { readDecimal, readWhole } from './read-number';

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

/** A whole number. Pasted "1 234" is understood; what is not understood stays and says so. */
export function NumberInput({
  value,
  onChange,
  onBlur,
  steps,
  large,
  least = 0,
  disabled,
  inputRef,
  ...field
}: Props) {
  const [typed, setTyped] = useState(asTyped(value));
  const [left, setLeft] = useState(false);
  const shown = readWhole(typed) === value ? typed : asTyped(value);
  const misread = left && typeof value === 'string' && value.trim() !== '';
  const change = (next: TypedNumber, as: string) => {
    setTyped(as);
    onChange(next);
  };
  const step = (by: 1 | -1) => {
    const next = Math.max(least, (typeof value === 'number' ? value : 0) + by);
    change(next, String(next));
  };
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
            onChange={(event) => change(readWhole(event.target.value), event.target.value)}
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
