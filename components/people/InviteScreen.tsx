import { router } from 'expo-router';
import { useFormContext } from 'react-hook-form';
import { listPartners } from '@/shared/contracts/partners';
import { invitePerson } from '@/shared/contracts/people';
import { text } from '@/shared/text/catalogue';
import { usePost, useRead } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { SelectField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Page } from '../ui/Page';
import { RolesField } from './RolesField';

const words = text.people;

export function InviteScreen() {
  const { company } = useSignedIn();
  const draft = useDraftForm({
    name: 'invite',
    schema: invitePerson.body!,
    defaultValues: { name: '', email: '', company: company.id, roles: [] },
  });
  const post = usePost(invitePerson, { refreshes: ['letters', 'partners'] });
  return (
    <Page title={words.invite} back={{ href: '/people', label: words.title }} narrow>
      <FormFrame
        draft={draft}
        label={words.invite}
        submitLabel={words.send}
        inBar
        onSubmit={async (body) => {
          await post.mutateAsync({ body });
          announce(words.invited(body.name));
          router.replace('/people');
        }}
      >
        <TextField name="name" label={words.fields.name} />
        <TextField name="email" label={words.fields.email} />
        <CompanyAndRoles />
      </FormFrame>
    </Page>
  );
}

/** The administrator chooses the company; a partner's manager invites into the own. */
function CompanyAndRoles() {
  const { company, may } = useSignedIn();
  const chosen = useFormContext<{ company: string }>().watch('company');
  const all = may('keep people');
  const { data } = useRead(listPartners, { query: { limit: 200 }, enabled: all });
  const companies = data?.rows ?? [{ id: company.id, name: company.name, kind: company.kind }];
  const kind = companies.find((each) => each.id === chosen)?.kind ?? company.kind;
  return (
    <>
      {all ? (
        <SelectField
          name="company"
          label={words.fields.company}
          options={companies.map((each) => ({ value: each.id, label: each.name }))}
        />
      ) : null}
      <RolesField kind={kind} />
    </>
  );
}
