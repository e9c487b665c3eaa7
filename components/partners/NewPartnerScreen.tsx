import { router } from 'expo-router';
import { addPartner } from '@/shared/contracts/partners';
import { currencyCodes } from '@/shared/domain/currencies';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { SelectField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Page } from '../ui/Page';

const words = text.partners;
const schema = addPartner.body!;

export function NewPartnerScreen() {
  const draft = useDraftForm({
    name: 'new partner',
    schema,
    defaultValues: {
      code: '',
      name: '',
      email: '',
      address: '',
      gln: '',
      currency: 'EUR',
      siteCode: '',
      siteName: '',
      timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone,
    },
  });
  const post = usePost(addPartner);
  return (
    <Page title={words.add} back={{ href: '/partners', label: words.title }} narrow>
      <FormFrame
        draft={draft}
        label={words.add}
        submitLabel={words.add}
        inBar
        onSubmit={async (body) => {
          const { id } = await post.mutateAsync({ body });
          announce(words.added);
          router.replace(`/partners/${id}`);
        }}
      >
        <TextField name="name" label={words.fields.name} />
        <TextField name="code" label={words.fields.code} hint={words.fields.codeHint} />
        <SelectField
          name="currency"
          label={words.fields.currency}
          hint={words.fields.currencyHint}
          options={currencyCodes.map((code) => ({ value: code, label: code }))}
        />
        <TextField name="email" label={words.fields.email} optional />
        <TextField name="address" label={words.fields.address} optional />
        <TextField name="gln" label={words.fields.gln} hint={words.fields.glnHint} optional />
        <TextField name="siteName" label={words.fields.siteName} />
        <TextField name="siteCode" label={words.fields.siteCode} hint={words.fields.codeHint} />
        <TextField name="timeZone" label={words.fields.timeZone} />
      </FormFrame>
    </Page>
  );
}
