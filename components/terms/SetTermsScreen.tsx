import { router } from 'expo-router';
import { readPartnerTerms, setTerms, termsVersion } from '@/shared/contracts/terms';
import { addDays, lastDayOfMonth } from '@/shared/domain/calendar';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost, useRead } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import type { PartnerTermsPage } from './PartnerTermsScreen';
import { TermsFields } from './TermsFields';
import { startingTerms } from './starting-terms';

const words = text.terms;

/** New terms of a type from a day on, beginning from those in force. */
export function SetTermsScreen({ partner, type }: { partner: string; type?: string }) {
  const { data, error, refetch } = useRead(readPartnerTerms, { params: { partner } });
  const back = { href: `/terms/${partner}`, label: data ? words.partnerHead(data.partner.name) : words.head };
  return (
    <Page title={words.set} back={back} narrow>
      {data ? (
        <TermsForm key={type ?? ''} page={data} {...(type ? { type } : {})} />
      ) : error ? (
        <Problem error={error} onRetry={() => void refetch()} />
      ) : (
        <Skeleton lines={8} tall />
      )}
    </Page>
  );
}

function TermsForm({ page, type }: { page: PartnerTermsPage; type?: string }) {
  const { partner, closedThrough } = page;
  const set = usePost(setTerms, { refreshes: ['months'] });
  const draft = useDraftForm({
    schema: termsVersion,
    name: `terms ${partner.id} ${type ?? ''}`,
    defaultValues: startingTerms(page, type),
  });
  const first = closedThrough ? addDays(lastDayOfMonth(closedThrough), 1) : undefined;
  return (
    <Card>
      <Text variant="soft">{words.formNote}</Text>
      <FormFrame
        draft={draft}
        label={words.set}
        submitLabel={words.save}
        inBar
        onSubmit={async (body) => {
          await set.mutateAsync({ params: { partner: partner.id }, body });
          announce(words.saved);
          router.replace(`/terms/${partner.id}`);
        }}
      >
        <TermsFields page={page} type={type} first={first} />
      </FormFrame>
    </Card>
  );
}
