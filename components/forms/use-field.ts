import { get, useController, useFormContext } from 'react-hook-form';
import { fieldId } from './field-errors';
import { useFormPlace } from './form-place';

/** Ties an input to its place in the form: value, changes, error and id. */
export function useField<Value>(name: string, label: string) {
  const form = useFormPlace(name, label);
  const { control, formState } = useFormContext();
  const { field } = useController({ name, control });
  const error = get(formState.errors, name) as { message?: string; root?: { message?: string } } | undefined;
  return {
    id: fieldId(form, name),
    label,
    value: field.value as Value,
    onChange: field.onChange as (value: Value) => void,
    onBlur: field.onBlur,
    inputRef: field.ref,
    error: error?.message ?? error?.root?.message,
  };
}
