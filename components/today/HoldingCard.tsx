import type { Today } from '@/shared/contracts/today';
import { text } from '@/shared/text/catalogue';
import { formatNumber } from '@/shared/text/format';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link, RowLink } from '../ui/Link';
import { Strip } from '../ui/Strip';
import { Text } from '../ui/Text';

const words = text.today;
/** Below so many days of packing it is said. */
const fewDays = 5;

/** What a partner holds, as the strip, and how long it lasts. */
export function HoldingCard({ today }: { today: Today }) {
  const { holding, runningShort } = today;
  if (!holding) return null;
  const short = runningShort?.[0];
  return (
    <Card
      title={words.hold}
      beside={
        <RowLink href="/balances" name={text.balances.holds(holding.held)}>
          <Figure units={holding.held} size="figure" />
        </RowLink>
      }
    >
      <Strip
        label={words.hold}
        parts={[
          { key: 'atSites', units: holding.atSites, label: words.atSites, tone: 'done', href: '/balances' },
          {
            key: 'sent',
            units: holding.sent,
            label: words.sent,
            tone: 'moving',
            href: '/shipments?direction=out&state=on%20the%20way',
          },
          ...(holding.sentDiffers === 0
            ? []
            : [
                {
                  key: 'sentDiffers',
                  units: holding.sentDiffers,
                  label: words.sentDiffers,
                  tone: 'differs' as const,
                  href: '/shipments?direction=out&state=differs',
                },
              ]),
        ]}
      />
      {holding.toIt === 0 ? null : (
        <Link href="/shipments?direction=in&state=on%20the%20way" label={words.moreToIt(holding.toIt)} />
      )}
      {short && short.days < fewDays ? (
        <Text tone="differs">{words.lasts(short.typeName, formatNumber(short.days))}</Text>
      ) : null}
    </Card>
  );
}
