import { useController } from 'react-hook-form';
import type { CompanyKind, Role } from '@/shared/access/abilities';
import { rolesFor } from '@/shared/access/abilities';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Checkbox } from '../ui/Checkbox';
import { Text } from '../ui/Text';

const words = text.people;

/** The roles that a person of this kind of company can have, each with what it does. */
export function RolesField({ kind }: { kind: CompanyKind }) {
  const { field, fieldState } = useController<{ roles: Role[] }, 'roles'>({ name: 'roles' });
  const change = (role: Role, held: boolean): void =>
    field.onChange(held ? [...field.value, role] : field.value.filter((each) => each !== role));
  return (
    <Box gap="s">
      <Text variant="label">{words.fields.roles}</Text>
      {rolesFor(kind).map((role, index) => (
        <Checkbox
          key={role}
          label={words.roles[role].label}
          hint={words.roles[role].hint}
          value={field.value.includes(role)}
          onChange={(held) => change(role, held)}
          {...(index === 0 && fieldState.error?.message ? { error: fieldState.error.message } : {})}
        />
      ))}
    </Box>
  );
}
