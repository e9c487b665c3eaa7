import { router } from 'expo-router';
import { addPart, partForm } from '@/shared/contracts/parts';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Page } from '../ui/Page';
import { PartFields } from './PartFields';

const words = text.parts;

const empty = {
  number: '',
  name: '',
  typeCode: '',
  supplierSiteId: '',
  plantSiteId: '',
  unitsPerContainer: null as never,
  unitsPerDayMean: '',
  unitsPerDaySd: '',
};

export function NewPartScreen({ type }: { type?: string | undefined }) {
  const draft = useDraftForm({
    name: 'new part',
    schema: partForm,
    defaultValues: { ...empty, typeCode: type ?? '' },
  });
  const post = usePost(addPart, { refreshes: ['pool'] });
  return (
    <Page title={words.add} back={{ href: '/parts', label: words.title }} narrow>
      <FormFrame
        draft={draft}
        label={words.add}
        submitLabel={words.add}
        inBar
        onSubmit={async (body) => {
          await post.mutateAsync({ body });
          announce(words.added);
          router.replace('/parts');
        }}
      >
        <PartFields />
      </FormFrame>
    </Page>
  );
}
