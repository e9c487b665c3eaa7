import { router } from 'expo-router';
import { changePart, partChange, type PartRow, readPart } from '@/shared/contracts/parts';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost, useRead } from '../data/use-operation';
import { CheckboxField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { PartFields } from './PartFields';

const words = text.parts;
const back = { href: '/parts', label: words.title };

export function ChangePartScreen({ part }: { part: string }) {
  const { data, error, refetch } = useRead(readPart, { params: { part } });
  if (data) return <ChangeForm key={data.id} part={data} />;
  return (
    <Page title={words.one} back={back}>
      {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={8} tall />}
    </Page>
  );
}

function ChangeForm({ part }: { part: PartRow }) {
  const draft = useDraftForm({
    name: `part ${part.id}`,
    schema: partChange,
    defaultValues: {
      number: part.number,
      name: part.name,
      typeCode: part.type.code,
      supplierSiteId: part.supplierSite.id,
      plantSiteId: part.plantSite.id,
      unitsPerContainer: part.unitsPerContainer,
      unitsPerDayMean: part.unitsPerDayMean,
      unitsPerDaySd: part.unitsPerDaySd,
      active: part.active,
    },
  });
  const post = usePost(changePart, { refreshes: ['pool'] });
  return (
    <Page title={words.changeHead(part.number)} back={back} narrow>
      <FormFrame
        draft={draft}
        label={words.changeHead(part.number)}
        submitLabel={words.save}
        inBar
        more={<ButtonLink href="/parts" label={words.cancel} kind="secondary" />}
        onSubmit={async (body) => {
          await post.mutateAsync({ params: { part: part.id }, body });
          announce(words.changed);
          router.replace('/parts');
        }}
      >
        <PartFields chosen={part} />
        <Card>
          <CheckboxField name="active" label={words.form.active} hint={words.form.activeHint} />
        </Card>
      </FormFrame>
    </Page>
  );
}
