import { useState } from 'react';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Disclosure } from '../ui/Disclosure';
import { Select } from '../ui/Select';

const words = text.shipments;

type Props = { types: readonly { code: string; name: string }[]; onAdd: (typeCode: string) => void };

/** For what came although nobody declared it. */
export function AddType({ types, onAdd }: Props) {
  const [picked, setPicked] = useState('');
  const add = () => {
    onAdd(picked);
    setPicked('');
  };
  return (
    <Disclosure label={words.addType}>
      <Box gap="m">
        <Select
          label={words.addTypePick}
          value={picked}
          onChange={setPicked}
          options={types.map((type) => ({ value: type.code, label: type.name }))}
        />
        <Button kind="secondary" label={words.addTypeDo} disabled={picked === ''} onPress={add} />
      </Box>
    </Disclosure>
  );
}
