import { useState } from 'react';
import type { AnswerOf } from '@/shared/contracts/operation';
import { listShipmentChoices, type sendShipment } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { ButtonLink } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { SendForm } from './SendForm';

const words = text.shipments;
export type Sent = AnswerOf<typeof sendShipment>;

/** Empties by the operator, fulls by a partner: one form, two callers. */
export function SendScreen() {
  const choices = useRead(listShipmentChoices);
  const [sent, setSent] = useState<Sent>();
  const contents = choices.data?.contents ?? 'empties';
  return (
    <Page
      title={words.send[contents]}
      lead={words.sendLead[contents]}
      back={{ href: '/shipments', label: words.head }}
      narrow
    >
      {choices.error && !choices.data ? (
        <Problem error={choices.error} onRetry={() => void choices.refetch()} />
      ) : null}
      {choices.isPending ? <Skeleton lines={6} tall /> : null}
      {sent ? <IsSent sent={sent} onAnother={() => setSent(undefined)} /> : null}
      {choices.data && !sent ? <SendForm choices={choices.data} onSent={setSent} /> : null}
    </Page>
  );
}

function IsSent({ sent, onAnother }: { sent: Sent; onAnother: () => void }) {
  return (
    <Notice kind="success" title={words.sent(sent.toCompany)}>
      <Box row wrap gap="m">
        <ButtonLink href={`/shipments/${sent.id}`} label={words.openSent(sent.reference)} />
        <Button kind="secondary" label={words.sendAnother} onPress={onAnother} />
      </Box>
    </Notice>
  );
}
