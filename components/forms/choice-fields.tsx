import { FileInput } from '../ui/FileInput';
import type { FieldProps } from '../ui/Field';
import { Checkbox } from '../ui/Checkbox';
import { Choice } from '../ui/Choice';
import { DateInput } from '../ui/DateInput';
import { Select, type Option } from '../ui/Select';
import { useField } from './use-field';

type Named = { name: string } & Pick<FieldProps, 'label' | 'hint' | 'optional' | 'hideLabel'>;

type SelectFieldProps = Named & {
  options: readonly Option[];
  placeholder?: string | null;
  disabled?: boolean;
};

export function SelectField({ name, ...rest }: SelectFieldProps) {
  const { value, ...field } = useField<string>(name, rest.label);
  return <Select {...rest} {...field} value={value ?? ''} />;
}

export function DateField({ name, ...rest }: Named & { from?: string; to?: string; month?: boolean }) {
  const { value, ...field } = useField<string>(name, rest.label);
  return <DateInput {...rest} {...field} value={value ?? ''} />;
}

export function ChoiceField({ name, ...rest }: Named & { options: readonly Option[]; below?: boolean }) {
  const { value, id, error, onChange } = useField<string>(name, rest.label);
  return <Choice {...rest} id={id} error={error} onChange={onChange} value={value ?? ''} />;
}

export function CheckboxField({ name, ...rest }: Named) {
  const { value, id, error, onChange, onBlur } = useField<boolean>(name, rest.label);
  return (
    <Checkbox {...rest} id={id} error={error} onChange={onChange} onBlur={onBlur} value={value ?? false} />
  );
}

type FilesFieldProps = Named & {
  kind?: 'photo' | 'paper' | 'sheet';
  most?: number;
  accept?: readonly string[];
};

export function FilesField({ name, ...rest }: FilesFieldProps) {
  const { value, id, error, onChange } = useField<File[]>(name, rest.label);
  return <FileInput {...rest} id={id} error={error} onChange={onChange} value={value ?? []} />;
}
