import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { type LineSubject, readLineSubject } from '@/shared/contracts/disputes';
import { amountOfUnits, isClaimableAmount } from '@/shared/domain/disputed-line';
import { decimalString } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { formatMonth } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { MoneyField, NumberField } from '../forms/text-fields';
import { useDraftForm, type DraftForm } from '../forms/use-draft-form';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { lineDraft, type openingDraft } from './dispute-draft';
import { DisputeForm } from './DisputeForm';
import { ShipmentField } from './ShipmentField';

const words = text.disputes.form;

/** Disputing one line of a statement: what it should be is said in units where it counts units, else in money. */
export function DisputeLineScreen({ statement, line }: { statement: string; line: string }) {
  const { data, error, refetch } = useRead(readLineSubject, { params: { line } });
  const back = {
    href: `/statements/${statement}`,
    label: data ? words.backToStatement(data.statementMonth) : text.shell.place.statements,
  };
  return (
    <Page title={words.lineHead} back={back} narrow>
      {data ? (
        <>
          <LineCard subject={data} />
          {data.blocked ? <Blocked subject={data} /> : <LineForm key={line} subject={data} />}
        </>
      ) : error ? (
        <Problem error={error} onRetry={() => void refetch()} />
      ) : (
        <Skeleton lines={6} tall />
      )}
    </Page>
  );
}

function LineCard({ subject }: { subject: LineSubject }) {
  const { typeName, quantity, way, component } = subject;
  return (
    <Card gap="xs">
      <Box row wrap spread="between">
        <Text variant="subhead" level={2}>
          {words.line(subject)}
        </Text>
        <Tag tone={component === 'lost' ? 'differs' : 'open'} label={formatMonth(subject.accountMonth)} />
      </Box>
      {typeName ? <Text>{typeName}</Text> : null}
      {way === null && component === 'daily fee' ? <Text>{words.unitDays(quantity)}</Text> : null}
      <Figure money={subject.amount} currency={subject.currency} />
    </Card>
  );
}

function Blocked({ subject }: { subject: LineSubject }) {
  if (subject.openDisputeId)
    return (
      <Notice kind="caution">
        <Text>{words.already}</Text>
        <Link href={`/disputes/${subject.openDisputeId}`} label={words.openIt} />
      </Notice>
    );
  return (
    <Notice kind="caution">
      <Text>
        {subject.blocked === 'confirmed'
          ? words.blocked.confirmed
          : words.blocked['objection over'](subject.objectionUntil ?? '')}
      </Text>
      <Link href="/shipments" label={text.disputes.list.toShipments} />
    </Notice>
  );
}

function LineForm({ subject }: { subject: LineSubject }) {
  const [schema] = useState(() => lineDraft(subject));
  const draft = useDraftForm({
    name: `dispute line ${subject.lineId}`,
    schema,
    defaultValues: { subject: 'statement line', lineId: subject.lineId, text: '', files: [] },
  });
  return (
    <DisputeForm
      draft={draft}
      label={words.lineHead}
      claim={
        subject.way === null ? (
          <MoneyClaim draft={draft} subject={subject} />
        ) : (
          <UnitsClaim draft={draft} subject={subject} />
        )
      }
      more={subject.component === 'lost' ? <ShipmentField shipments={subject.shipments} /> : null}
    />
  );
}

type ClaimProps = { draft: DraftForm<typeof openingDraft>; subject: LineSubject };

/** "5 fewer. EUR 36.00 is held back until this is decided." */
function UnitsClaim({ draft, subject }: ClaimProps) {
  const { claimed } = useWatch({ control: draft.form.control });
  return <NumberField name="claimed" label={words.claimed} large hint={heldWords(subject, claimed)} />;
}

function heldWords(subject: LineSubject, claimed: unknown): string {
  const { way, quantity, currency } = subject;
  const by = typeof claimed === 'number' ? claimed - quantity : 0;
  const fits = way === 'fewer' ? by < 0 : by > 0;
  if (!fits) return way === 'fewer' ? words.onlyFewer(quantity) : words.onlyMore(quantity);
  return words.held(by, amountOfUnits(subject, Math.abs(by)), currency);
}

function MoneyClaim({ draft, subject }: ClaimProps) {
  const { tooMuch } = useWatch({ control: draft.form.control });
  const { currency, amount } = subject;
  const typed = decimalString.safeParse(tooMuch);
  const hint =
    typed.success && isClaimableAmount(subject, typed.data)
      ? words.heldAmount(typed.data, currency)
      : words.atMost(amount.replace(/^-/, ''), currency);
  return <MoneyField name="tooMuch" label={words.tooMuch} currency={currency} hint={hint} />;
}
