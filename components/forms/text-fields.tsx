import { MoneyInput } from '../ui/MoneyInput';
import { NumberInput, type TypedNumber } from '../ui/NumberInput';
import { TextArea, TextInput } from '../ui/TextInput';
import { useField } from './use-field';

type Tied = 'value' | 'onChange' | 'onBlur' | 'inputRef' | 'error' | 'id';
type Named<Props> = { name: string } & Omit<Props, Tied>;

export function TextField({ name, ...rest }: Named<Parameters<typeof TextInput>[0]>) {
  const { value, ...field } = useField<string>(name, rest.label);
  return <TextInput {...rest} {...field} value={value ?? ''} />;
}

export function TextAreaField({ name, ...rest }: Named<Parameters<typeof TextArea>[0]>) {
  const { value, ...field } = useField<string>(name, rest.label);
  return <TextArea {...rest} {...field} value={value ?? ''} />;
}

export function NumberField({ name, ...rest }: Named<Parameters<typeof NumberInput>[0]>) {
  const { value, ...field } = useField<TypedNumber>(name, rest.label);
  return <NumberInput {...rest} {...field} value={value ?? null} />;
}

export function MoneyField({ name, ...rest }: Named<Parameters<typeof MoneyInput>[0]>) {
  const { value, ...field } = useField<string>(name, rest.label);
  return <MoneyInput {...rest} {...field} value={value ?? ''} />;
}
