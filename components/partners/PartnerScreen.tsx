import type { z } from 'zod';
import { changePartner, readPartner } from '@/shared/contracts/partners';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost, useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { CheckboxField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { Link } from '../ui/Link';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import { SitesCard } from './SitesCard';

const words = text.partners;
export type Partner = z.output<typeof readPartner.answer>;

export function PartnerScreen({ partner }: { partner: string }) {
  const { data, error, refetch } = useRead(readPartner, { params: { partner } });
  const { may } = useSignedIn();
  const back = { href: '/partners', label: words.title };
  if (!data) {
    return (
      <Page title={words.one} back={back}>
        {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={6} tall />}
      </Page>
    );
  }
  const keeps = may('keep partners');
  return (
    <Page
      title={data.name}
      kicker={`${words.kinds[data.kind]} · ${data.code} · ${data.currency}`}
      back={back}
      aside={
        <Card>
          {may('see people') ? <Link href={`/people?company=${data.id}`} label={words.people} /> : null}
          {may('see terms') && data.kind === 'partner' ? (
            <Link href={`/terms/${data.id}`} label={words.terms} />
          ) : null}
        </Card>
      }
    >
      <SitesCard partner={data} mayAdd={keeps} />
      {keeps ? <ChangeCard key={data.id} partner={data} /> : <Facts partner={data} />}
    </Page>
  );
}

function Facts({ partner }: { partner: Partner }) {
  const lines = [partner.address, partner.email, partner.gln].filter((line) => line !== null);
  return lines.length === 0 ? null : (
    <Card>
      {lines.map((line) => (
        <Text key={line}>{line}</Text>
      ))}
    </Card>
  );
}

function ChangeCard({ partner }: { partner: Partner }) {
  const draft = useDraftForm({
    name: `partner ${partner.id}`,
    schema: changePartner.body!,
    defaultValues: {
      name: partner.name,
      email: partner.email ?? '',
      address: partner.address ?? '',
      gln: partner.gln ?? '',
      active: partner.active,
    },
  });
  const post = usePost(changePartner);
  return (
    <Card title={words.change}>
      <FormFrame
        draft={draft}
        label={words.change}
        submitLabel={words.save}
        onSubmit={async (body) => {
          await post.mutateAsync({ params: { partner: partner.id }, body });
          announce(words.changed);
        }}
      >
        <TextField name="name" label={words.fields.name} />
        <TextField name="email" label={words.fields.email} optional />
        <TextField name="address" label={words.fields.address} optional />
        <TextField name="gln" label={words.fields.gln} hint={words.fields.glnHint} optional />
        <CheckboxField name="active" label={words.fields.active} />
      </FormFrame>
    </Card>
  );
}
