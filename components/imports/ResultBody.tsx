import type { ImportDetail, ImportNumbers } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { useSignedIn } from '../data/use-session';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { ButtonLink, Link } from '../ui/Link';
import { Text } from '../ui/Text';

const words = text.imports.result;
type Line = { label: string; units: number; href: string };

/** What came of the file in numbers, each opening what it counts; what waits for a decision first. */
export function ResultBody({ held }: { held: ImportDetail }) {
  const { company } = useSignedIn();
  const { numbers } = held;
  if (!numbers) return null;
  const ended = held.endedAt ? formatInstant(held.endedAt, company.timeZone) : '';
  return (
    <>
      <Text variant="soft">{words.lead(held.confirmedBy ?? '', ended)}</Text>
      <ToDecide id={held.id} numbers={numbers} />
      <Lines title={words.matchesHead} lines={matchLines(held.id, numbers)} none={words.noMatches} />
      <Lines title={words.shipmentsHead} lines={shipmentLines(held.id, numbers)} />
      <Lines title={words.doneHead} lines={decidedLines(held.id, numbers)} />
      <Lines title={words.openHead} lines={openLines(numbers)} />
    </>
  );
}

function ToDecide({ id, numbers }: { id: string; numbers: ImportNumbers }) {
  const { offered, unannounced } = numbers;
  if (offered + unannounced === 0)
    return (
      <Card title={words.decideHead}>
        <Text>{words.nothingToDecide}</Text>
      </Card>
    );
  return (
    <Card title={words.decideHead} tone="moving">
      {offered > 0 ? (
        <Decision label={words.suggestions} units={offered} href={`/imports/${id}/suggestions`} />
      ) : null}
      {unannounced > 0 ? (
        <Decision
          label={words.unannounced}
          units={unannounced}
          href={`/imports/${id}/receipts?state=unannounced`}
        />
      ) : null}
    </Card>
  );
}

function Decision({ label, units, href }: Line) {
  return (
    <Box row wrap spread="between" gap="m">
      <Box row gap="m" align="baseline">
        <Figure units={units} size="head" />
        <Text>{label}</Text>
      </Box>
      <ButtonLink href={href} label={text.ui.open} name={`${text.ui.open}: ${label}`} kind="secondary" />
    </Box>
  );
}

function Lines({ title, lines, none }: { title: string; lines: readonly Line[]; none?: string }) {
  const shown = lines.filter(({ units }) => units > 0);
  if (shown.length === 0 && none === undefined) return null;
  return (
    <Card title={title}>
      {shown.length === 0 ? <Text variant="soft">{none}</Text> : null}
      {shown.map((line) => (
        <Box key={line.label} row spread="between" gap="l">
          <Link href={line.href} label={line.label} />
          <Figure units={line.units} />
        </Box>
      ))}
    </Card>
  );
}

const matchLines = (id: string, { matches, notPosted }: ImportNumbers): Line[] => [
  ...matches.map(({ rule, groups }) => ({
    label: text.imports.rule(rule),
    units: groups,
    href: `/imports/${id}/matches?state=matched&rule=${encodeURIComponent(rule)}`,
  })),
  { label: words.notPosted, units: notPosted, href: `/imports/${id}/matches?state=not+posted` },
];

const shipmentLines = (id: string, { shipments }: ImportNumbers): Line[] => [
  { label: words.posted, units: shipments.posted, href: `/imports/${id}/shipments?outcome=posted` },
  { label: words.known, units: shipments.known, href: `/imports/${id}/shipments?outcome=known` },
  {
    label: words.refusedShipments,
    units: shipments.refused,
    href: `/imports/${id}/shipments?outcome=refused`,
  },
];

const decidedLines = (id: string, numbers: ImportNumbers): Line[] => [
  { label: words.accepted, units: numbers.accepted, href: `/imports/${id}/matches?state=accepted` },
  { label: words.refused, units: numbers.refused, href: `/imports/${id}/matches?state=refused` },
  { label: words.booked, units: numbers.booked, href: `/imports/${id}/receipts?state=booked` },
  { label: words.duplicates, units: numbers.duplicates, href: `/imports/${id}/receipts?state=duplicate` },
];

const openLines = ({ onTheWay, overdue }: ImportNumbers): Line[] => [
  { label: words.onTheWay, units: onTheWay, href: '/shipments?state=on+the+way' },
  { label: words.overdue, units: overdue, href: '/shipments?state=overdue' },
];
