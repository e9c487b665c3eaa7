import { text } from '@/shared/text/catalogue';
import { formatUnits } from '@/shared/text/format';
import { AgeBar } from '../ui/AgeBar';
import { Box } from '../ui/Box';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Sheet, type SheetColumn } from '../ui/Sheet';
import { Text } from '../ui/Text';
import { AgeKey, agePartsOf } from './ages';
import { movementsHref, type Behind } from './movements-href';
import type { StatementPage } from './StatementScreen';

const words = text.statements.page;
type Line = StatementPage['content']['assessment']['lines'][number];
type Units = 'opening' | 'issued' | 'returned' | 'lost' | 'found' | 'closing';

const behind: Record<Units, (type: string) => Behind> = {
  opening: (type) => ({ type, before: 'yes' }),
  issued: (type) => ({ type, kind: 'issued' }),
  returned: (type) => ({ type, kind: 'returned' }),
  lost: (type) => ({ type, kind: 'lost' }),
  found: (type) => ({ type, kind: 'found' }),
  closing: (type) => ({ type }),
};

/** Units by type: what came, what went, what is held and for how long. Each number opens its movements. */
export function ContainersSheet({ page }: { page: StatementPage }) {
  const { assessment, types } = page.content;
  const nameOf = (line: Line) =>
    types.find((type) => type.code === line.containerType)?.name ?? line.containerType;
  const units = (key: Units): SheetColumn<Line> => ({
    key,
    head: words[key],
    align: 'end',
    cell: (line) => <UnitsLink page={page} line={line} what={key} name={nameOf(line)} />,
  });
  const columns: SheetColumn<Line>[] = [
    { key: 'type', head: words.type, cell: (line) => <TypeCell line={line} name={nameOf(line)} /> },
    ...(['opening', 'issued', 'returned', 'lost', 'found', 'closing'] as const).map(units),
    {
      key: 'ages',
      head: words.heldFor,
      width: 170,
      cell: (line) => <AgeBar label={`${nameOf(line)}, ${words.heldFor}`} parts={agePartsOf(line.ages)} />,
    },
  ];
  return (
    <Box gap="s">
      <Sheet
        caption={words.containers}
        columns={columns}
        rows={assessment.lines}
        rowKey={(line) => line.containerType}
        stack
      />
      <AgeKey />
    </Box>
  );
}

function TypeCell({ line, name }: { line: Line; name: string }) {
  const { overReturned } = line.units;
  return (
    <Box gap="xs">
      <Text>{name}</Text>
      {overReturned > 0 ? <Text variant="small">{words.overReturned(formatUnits(overReturned))}</Text> : null}
    </Box>
  );
}

type UnitsProps = { page: StatementPage; line: Line; what: Units; name: string };

function UnitsLink({ page, line, what, name }: UnitsProps) {
  const units = line.units[what];
  if (units === 0) return <Figure units={0} plain tone="soft" />;
  return (
    <Link
      href={movementsHref(page.id, behind[what](line.containerType))}
      label={formatUnits(units)}
      name={words.movementsOf(`${name}, ${words[what]}: ${formatUnits(units)}`)}
      tone="text"
      strong={what === 'closing'}
    />
  );
}
