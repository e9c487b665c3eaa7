import type { ShipmentDetail } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Sheet, type SheetColumn } from '../ui/Sheet';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { differenceOf } from './difference-words';

const words = text.shipments;
type Line = ShipmentDetail['lines'][number];

const figure = (units: number | null) => <Figure units={units} plain />;

const columns: readonly SheetColumn<Line>[] = [
  { key: 'type', head: words.type, cell: (line) => line.typeName },
  { key: 'declared', head: words.declared, align: 'end', cell: (line) => figure(line.declared) },
  { key: 'counted', head: words.counted, align: 'end', cell: (line) => <Counted line={line} /> },
  { key: 'damaged', head: words.damaged, align: 'end', cell: (line) => figure(line.damaged) },
  { key: 'dirty', head: words.dirty, align: 'end', cell: (line) => figure(line.dirty) },
  { key: 'difference', head: words.difference, cell: (line) => <Difference line={line} /> },
];

/** Declared against counted, line by line, and the sum. */
export function LinesCard({ shipment }: { shipment: ShipmentDetail }) {
  const isCounted = shipment.state === 'counted';
  const sum = (part: 'declared' | 'damaged' | 'dirty') =>
    shipment.lines.reduce((units, line) => units + line[part], 0);
  const counted = shipment.lines.reduce((units, line) => units + (line.countedNow ?? 0), 0);
  return (
    <Card title={words.linesHead}>
      <Sheet
        caption={words.linesHead}
        hideCaption
        columns={isCounted ? columns : columns.slice(0, 2)}
        rows={shipment.lines}
        rowKey={(line) => line.typeCode}
        sum={{
          type: text.ui.sum,
          declared: figure(sum('declared')),
          counted: figure(isCounted ? counted : null),
          damaged: figure(sum('damaged')),
          dirty: figure(sum('dirty')),
        }}
        stack
      />
    </Card>
  );
}

/** The count as it stands; the first one beside it where it was put right. */
function Counted({ line }: { line: Line }) {
  if (line.countedNow === line.counted || line.counted === null) return figure(line.counted);
  return (
    <Box gap="xs" align="end">
      {figure(line.countedNow)}
      <Text variant="small">{words.firstCounted(line.counted)}</Text>
    </Box>
  );
}

function Difference({ line }: { line: Line }) {
  if (line.counted === null) return <Text variant="soft">{words.notCounted}</Text>;
  if (line.openUnits !== 0) return <Tag {...differenceOf(line.openUnits)} />;
  const by = (line.countedNow ?? line.counted) - line.declared;
  return by === 0 ? (
    <Tag tone="done" label={words.asDeclared} />
  ) : (
    <Tag tone="done" label={words.settledDifference(by)} />
  );
}
