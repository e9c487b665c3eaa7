import { router } from 'expo-router';
import {
  changeContainerType,
  containerTypeChange,
  type ContainerType,
  readContainerType,
} from '@/shared/contracts/container-types';
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
import { typeValues } from './type-form';
import { TypeFields } from './TypeFields';

const words = text.containerTypes;

export function ChangeTypeScreen({ type }: { type: string }) {
  const { data, error, refetch } = useRead(readContainerType, { params: { type } });
  if (data) return <ChangeForm key={data.code} type={data} />;
  return (
    <Page title={words.change} back={{ href: '/container-types', label: words.title }}>
      {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={8} tall />}
    </Page>
  );
}

function ChangeForm({ type }: { type: ContainerType }) {
  const href = `/container-types/${type.code}`;
  const draft = useDraftForm({
    name: `container type ${type.code}`,
    schema: containerTypeChange,
    defaultValues: typeValues(type),
  });
  const post = usePost(changeContainerType, { refreshes: ['pool', 'parts', 'shipments'] });
  return (
    <Page title={words.changeHead(type.name)} back={{ href, label: type.name }} narrow>
      <FormFrame
        draft={draft}
        label={words.change}
        submitLabel={words.save}
        inBar
        more={<ButtonLink href={href} label={words.cancel} kind="secondary" />}
        onSubmit={async (body) => {
          await post.mutateAsync({ params: { type: type.code }, body });
          announce(words.changed);
          router.replace(href);
        }}
      >
        <TypeFields control={draft.form.control} own={type.code} inServiceFixed={type.inServiceFixed} />
        <Card>
          <CheckboxField name="active" label={words.form.active} hint={words.form.activeHint} />
        </Card>
      </FormFrame>
    </Page>
  );
}
