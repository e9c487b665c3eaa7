import { useState } from 'react';
import { type BalancePart, listMovements, type MovementRow } from '@/shared/contracts/balances';
import { text } from '@/shared/text/catalogue';
import { useReadPages } from '../data/use-operation';
import { RecordList } from '../tables/RecordList';
import { Box } from '../ui/Box';
import { Text } from '../ui/Text';
import { movementColumns } from './movement-columns';
import { TakeBack } from './TakeBack';

const words = text.balances;

type Props = {
  company: string;
  type: string;
  part: BalancePart;
  asOf: string | undefined;
  site: string | undefined;
};

/** The lines that add up to the chosen part, newest first; each opens its shipment. */
export function Movements({ company, type, part, asOf, site }: Props) {
  const [takingBack, setTakingBack] = useState<MovementRow>();
  const list = useReadPages(listMovements, {
    params: { company, type },
    query: { part, ...(asOf === undefined ? {} : { asOf }), ...(site === undefined ? {} : { site }) },
  });
  const head = words.movementsHead(words.part[part]);
  return (
    <Box gap="m">
      <Text variant="title">{head}</Text>
      <RecordList<MovementRow>
        label={head}
        list={list}
        columns={movementColumns(setTakingBack)}
        rowKey={(row) => row.id}
        empty={{ title: words.noMovements, hint: words.noMovementsHint }}
      />
      {takingBack ? <TakeBack movement={takingBack} onClose={() => setTakingBack(undefined)} /> : null}
    </Box>
  );
}
