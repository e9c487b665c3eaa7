import { useState } from 'react';
import { listAdjustmentChoices } from '@/shared/contracts/balances';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { ButtonLink } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { AdjustForm, type Booked } from './AdjustForm';

const words = text.balances;

/** Bought, scrapped, found, lost, or there from the start. */
export function AdjustScreen() {
  const choices = useRead(listAdjustmentChoices);
  const { company } = useSignedIn();
  const [booked, setBooked] = useState<Booked>();
  return (
    <Page
      title={words.adjust}
      lead={words.adjustLead}
      back={{ href: '/balances', label: words.head[company.kind] }}
      narrow
    >
      {choices.error && !choices.data ? (
        <Problem error={choices.error} onRetry={() => void choices.refetch()} />
      ) : null}
      {choices.isPending ? <Skeleton lines={6} tall /> : null}
      {booked ? (
        <Notice kind="success" title={words.booked(booked.units, booked.entryId)}>
          <Box row wrap gap="m">
            <ButtonLink href="/balances" label={words.toBalances} />
            <Button kind="secondary" label={words.bookAnother} onPress={() => setBooked(undefined)} />
          </Box>
        </Notice>
      ) : null}
      {choices.data && !booked ? <AdjustForm choices={choices.data} onBooked={setBooked} /> : null}
    </Page>
  );
}
