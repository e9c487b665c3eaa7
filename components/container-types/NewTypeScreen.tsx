import { router } from 'expo-router';
import { addContainerType, containerTypeForm } from '@/shared/contracts/container-types';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Page } from '../ui/Page';
import { newTypeValues } from './type-form';
import { TypeFields } from './TypeFields';

const words = text.containerTypes;

export function NewTypeScreen() {
  const draft = useDraftForm({
    name: 'new container type',
    schema: containerTypeForm,
    defaultValues: newTypeValues,
  });
  const post = usePost(addContainerType, { refreshes: ['pool', 'parts', 'shipments'] });
  return (
    <Page title={words.add} back={{ href: '/container-types', label: words.title }} narrow>
      <FormFrame
        draft={draft}
        label={words.add}
        submitLabel={words.add}
        inBar
        onSubmit={async (body) => {
          const { id } = await post.mutateAsync({ body });
          announce(words.added);
          router.replace(`/container-types/${id}`);
        }}
      >
        <TypeFields
          control={draft.form.control}
          first={<TextField name="code" label={words.form.code} hint={words.form.codeHint} />}
        />
      </FormFrame>
    </Page>
  );
}
