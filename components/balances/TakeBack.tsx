import { type MovementRow, reversalForm, reverseEntry } from '@/shared/contracts/balances';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { TextAreaField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { Dialog } from '../ui/Dialog';
import { Text } from '../ui/Text';

const words = text.balances;

/** Asks why, then posts the entry that undoes an adjustment. */
export function TakeBack({ movement, onClose }: { movement: MovementRow; onClose: () => void }) {
  const post = usePost(reverseEntry, { refreshes: ['today'] });
  const draft = useDraftForm({
    schema: reversalForm,
    name: `take back ${movement.entryId}`,
    defaultValues: { reason: '' },
  });
  const send = async ({ reason }: { reason: string }) => {
    await post.mutateAsync({ params: { entry: movement.entryId }, body: { reason } });
    onClose();
  };
  return (
    <Dialog open title={words.takeBackHead(movement.entryId)} onClose={onClose}>
      <Text>{words.takeBackLead}</Text>
      <FormFrame
        draft={draft}
        label={words.takeBackHead(movement.entryId)}
        onSubmit={send}
        submitLabel={words.takeBackDo}
      >
        <TextAreaField name="reason" label={words.takeBackReason} />
      </FormFrame>
    </Dialog>
  );
}
