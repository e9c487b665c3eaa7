import { changePerson, inviteAgain, type PersonRow, readPersonRow } from '@/shared/contracts/people';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost, useRead } from '../data/use-operation';
import { CheckboxField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import { RolesField } from './RolesField';

const words = text.people;

export function PersonScreen({ person }: { person: string }) {
  const { data, error, refetch } = useRead(readPersonRow, { params: { person } });
  const back = { href: '/people', label: words.title };
  if (!data) {
    return (
      <Page title={words.title} back={back} narrow>
        {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Skeleton lines={6} tall />}
      </Page>
    );
  }
  return (
    <Page title={data.name} kicker={data.company.name} lead={data.email} back={back} narrow>
      {data.state === 'invited' ? <Invited person={data} /> : null}
      <ChangeForm key={data.id} person={data} />
    </Page>
  );
}

function Invited({ person }: { person: PersonRow }) {
  const post = usePost(inviteAgain, { refreshes: ['letters'] });
  const send = () =>
    post.mutate({ params: { person: person.id } }, { onSuccess: () => announce(words.sentAgain) });
  return (
    <Card>
      <Text>{words.states.invited}</Text>
      {post.error ? <Problem error={post.error} /> : null}
      <Button kind="secondary" label={words.again} busy={post.isPending} onPress={send} />
    </Card>
  );
}

function ChangeForm({ person }: { person: PersonRow }) {
  const draft = useDraftForm({
    name: `person ${person.id}`,
    schema: changePerson.body!,
    defaultValues: { name: person.name, roles: person.roles, active: person.state !== 'disabled' },
  });
  const post = usePost(changePerson);
  return (
    <FormFrame
      draft={draft}
      label={person.name}
      submitLabel={words.save}
      inBar
      onSubmit={async (body) => {
        await post.mutateAsync({ params: { person: person.id }, body });
        announce(words.saved);
      }}
    >
      <TextField name="name" label={words.fields.name} />
      <RolesField kind={person.company.kind} />
      <CheckboxField name="active" label={words.fields.active} hint={words.fields.activeHint} />
    </FormFrame>
  );
}
