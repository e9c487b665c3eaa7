import { closeMonth, closing } from '@/shared/contracts/months';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { TextAreaField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { Text } from '../ui/Text';
import type { MonthPage } from './MonthScreen';

const words = text.months;

/** Closing: with a reason while something stands open. */
export function CloseForm({ page }: { page: MonthPage }) {
  const { month, openItems } = page;
  const close = usePost(closeMonth, { refreshes: ['statements'] });
  const draft = useDraftForm({
    schema: closing,
    name: `close ${month}`,
    defaultValues: { reason: '' },
  });
  return (
    <Card title={words.closeHead(month)}>
      <Text variant="soft">{words.closeNote}</Text>
      <FormFrame
        draft={draft}
        label={words.closeHead(month)}
        submitLabel={words.close}
        inBar
        onSubmit={async (body) => {
          await close.mutateAsync({ params: { month }, body });
          announce(words.closeDone);
        }}
      >
        {openItems.length > 0 ? <TextAreaField name="reason" label={words.reason} rows={3} /> : null}
      </FormFrame>
    </Card>
  );
}
