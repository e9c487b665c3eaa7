import type { ImportMatch, MatchPaper } from '@/shared/contracts/import-results';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { Box } from '../ui/Box';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Text } from '../ui/Text';

const words = text.imports.matches;

/** What was declared and what was counted, side by side, and in words where they differ. */
export function MatchSides({ match }: { match: ImportMatch }) {
  return (
    <Box gap="m">
      <Box row wrap gap="xl" align="start">
        {match.shipments.map((paper) => (
          <Side key={paper.id} head={words.shipmentSide} paper={paper} href={`/shipments/${paper.id}`} />
        ))}
        {match.receipts.map((paper) => (
          <Side key={paper.id} head={words.receiptSide} paper={paper} />
        ))}
      </Box>
      {match.differences.length === 0 ? <Text variant="soft">{words.alike}</Text> : null}
      {match.differences.map(({ typeCode, declared, counted }) => (
        <Text key={typeCode} tone="differs">
          {words.differs(typeCode, declared, counted)}
        </Text>
      ))}
    </Box>
  );
}

function Side({ head, paper, href }: { head: string; paper: MatchPaper; href?: string }) {
  const name = paper.reference ?? words.noReference;
  return (
    <Box grow least={220} gap="xs">
      <Text variant="small">{head}</Text>
      {href === undefined ? <Text strong>{name}</Text> : <Link href={href} label={name} />}
      <Text>{`${paper.from} → ${paper.to}`}</Text>
      <Text variant="soft">{formatDay(paper.day)}</Text>
      {paper.lines.length === 0 ? <Text variant="soft">{words.notCounted}</Text> : null}
      {paper.lines.map(({ typeCode, units }) => (
        <Box key={typeCode} row spread="between" gap="l">
          <Text>{typeCode}</Text>
          <Figure units={units} />
        </Box>
      ))}
    </Box>
  );
}

/** "EM-501" or "the receipt of 3 March", for labels. */
export const nameOfPapers = (papers: readonly MatchPaper[]): string =>
  papers.map(({ reference, day }) => reference ?? text.imports.receiptOf(day)).join(', ');
