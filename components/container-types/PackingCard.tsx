import type { ContainerType } from '@/shared/contracts/container-types';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Link } from '../ui/Link';
import { Text } from '../ui/Text';

const words = text.containerTypes;

/** The unit load that this type carries, and those that it is part of. */
export function PackingCard({ type }: { type: ContainerType }) {
  return (
    <Card title={words.packing}>
      {type.packedWith.length === 0 ? (
        <Text variant="soft">{words.packingNone}</Text>
      ) : (
        <Box gap="xs">
          <Text variant="soft">{words.packingLead(type.name)}</Text>
          <Packed types={type.packedWith} />
        </Box>
      )}
      {type.partOf.length === 0 ? null : (
        <Box gap="xs">
          <Text variant="soft">{words.partOf}</Text>
          <Packed types={type.partOf} loads />
        </Box>
      )}
    </Card>
  );
}

type PackedProps = { types: ContainerType['packedWith']; loads?: boolean };

function Packed({ types, loads }: PackedProps) {
  return (
    <>
      {types.map(({ code, name, quantity }) => (
        <Link
          key={code}
          href={`/container-types/${code}`}
          label={loads ? words.inLoad(quantity, name) : words.quantityOf(quantity, name)}
        />
      ))}
    </>
  );
}
