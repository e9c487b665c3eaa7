import { useWatch } from 'react-hook-form';
import { type CountSubject, readCountSubject } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { SelectField } from '../forms/choice-fields';
import { NumberField } from '../forms/text-fields';
import { useDraftForm, type DraftForm } from '../forms/use-draft-form';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { Link } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import { openingDraft } from './dispute-draft';
import { DisputeForm } from './DisputeForm';

const words = text.disputes.form;

/** Disputing the count of a shipment, one container type at a time. */
export function DisputeCountScreen({ shipment, type }: { shipment: string; type?: string }) {
  const { data, error, refetch } = useRead(readCountSubject, { params: { shipment } });
  const back = {
    href: `/shipments/${shipment}`,
    label: data ? words.backToShipment(data.reference) : text.shell.place.shipments,
  };
  return (
    <Page title={words.countHead} back={back} narrow>
      {data ? (
        <CountForm key={shipment} subject={data} type={type} />
      ) : error ? (
        <Problem error={error} onRetry={() => void refetch()} />
      ) : (
        <Skeleton lines={6} tall />
      )}
    </Page>
  );
}

function CountForm({ subject, type }: { subject: CountSubject; type: string | undefined }) {
  const first = subject.lines.find((line) => line.typeCode === type) ?? subject.lines[0];
  const draft = useDraftForm({
    name: `dispute count ${subject.countId}`,
    schema: openingDraft,
    defaultValues: {
      subject: 'count',
      shipmentId: subject.shipmentId,
      countId: subject.countId,
      typeCode: first?.typeCode ?? '',
      text: '',
      files: [],
    },
  });
  return (
    <DisputeForm
      draft={draft}
      label={words.countHead}
      claim={<CountClaim draft={draft} subject={subject} />}
    />
  );
}

function CountClaim({ draft, subject }: { draft: DraftForm<typeof openingDraft>; subject: CountSubject }) {
  const { typeCode, claimed } = useWatch({ control: draft.form.control });
  const line = subject.lines.find((each) => each.typeCode === typeCode);
  const by = line && typeof claimed === 'number' ? claimed - line.counted : undefined;
  return (
    <>
      {subject.lines.length > 1 ? (
        <SelectField
          name="typeCode"
          label={words.type}
          placeholder={null}
          options={subject.lines.map((each) => ({ value: each.typeCode, label: each.typeName }))}
        />
      ) : null}
      {line ? <LineCard subject={subject} line={line} /> : null}
      {line?.openDisputeId ? (
        <Notice kind="caution">
          <Text>{words.already}</Text>
          <Link href={`/disputes/${line.openDisputeId}`} label={words.openIt} />
        </Notice>
      ) : null}
      <NumberField
        name="claimed"
        label={words.claimed}
        large
        hint={by === undefined ? undefined : by === 0 ? words.same : words.countGap(by)}
      />
    </>
  );
}

function LineCard({ subject, line }: { subject: CountSubject; line: CountSubject['lines'][number] }) {
  const gap = line.counted - line.declared;
  return (
    <Card gap="xs">
      <Box row wrap spread="between">
        <Text variant="subhead" level={2}>
          {line.typeName}
        </Text>
        <Tag
          tone={gap === 0 ? 'done' : 'differs'}
          label={gap === 0 ? text.shipments.asDeclared : text.disputes.gap(gap)}
        />
      </Box>
      <Text>{`${words.declared(line.declared)}, ${words.counted(line.counted)}`}</Text>
      <Text variant="soft">{words.countOf(subject.reference, subject.countedOn)}</Text>
      <Text variant="soft">{words.lane(subject.from, subject.to)}</Text>
    </Card>
  );
}
