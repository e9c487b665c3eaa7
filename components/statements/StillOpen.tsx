import { roundToMinor, sum } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { unitsOf } from '@/shared/text/statement-words';
import { useSignedIn } from '../data/use-session';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Text } from '../ui/Text';
import type { StatementPage } from './StatementScreen';

const words = text.statements.page;

/** Differences that were not settled when the month ended and are not yet, with what they are worth. */
export function StillOpen({ page }: { page: StatementPage }) {
  const { may } = useSignedIn();
  const { stillOpen, content, currency } = page;
  if (stillOpen.length === 0) return null;
  const byType = new Map<string, number>();
  for (const { typeCode, openUnits } of stillOpen)
    byType.set(typeCode, (byType.get(typeCode) ?? 0) + Math.abs(openUnits));
  const units = [...byType]
    .map(([typeCode, quantity]) => unitsOf({ typeCode, quantity }, content))
    .join(', ');
  return (
    <Card title={words.stillOpen(page.month)}>
      <Box row spread="between" align="start">
        <Text>{words.differences(stillOpen.length, units)}</Text>
        <Figure
          money={roundToMinor(sum(stillOpen.map((each) => each.atStake)), currency)}
          currency={currency}
        />
      </Box>
      <Text variant="soft">{words.stillOpenNote}</Text>
      {may('see differences') ? (
        <Link href={`/differences?partner=${page.partner.id}`} label={words.toDifferences} />
      ) : null}
    </Card>
  );
}
