import type { AnswerOf } from '@/shared/contracts/operation';
import { type listShipmentChoices, sendShipment } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { DateField, SelectField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { TextAreaField, TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { Box } from '../ui/Box';
import { Card } from '../ui/Card';
import { LoadLines } from './LoadLines';
import { emptySending, type SendDraft, sendDraft } from './send-draft';
import type { Sent } from './SendScreen';

const words = text.shipments;

export type Choices = AnswerOf<typeof listShipmentChoices>;
type Props = { choices: Choices; onSent: (sent: Sent) => void };

export function SendForm({ choices, onSent }: Props) {
  const post = usePost(sendShipment, { refreshes: ['balances', 'today'] });
  const draft = useDraftForm({
    schema: sendDraft,
    name: `send ${choices.contents}`,
    defaultValues: emptySending(choices),
  });
  const send = async ({ reference, ...rest }: SendDraft) =>
    onSent(await post.mutateAsync({ body: { ...rest, ...(reference === '' ? {} : { reference }) } }));
  return (
    <FormFrame
      draft={draft}
      label={words.send[choices.contents]}
      onSubmit={send}
      submitLabel={words.send[choices.contents]}
      inBar
    >
      <Card>
        <SelectField name="fromSiteId" label={words.form.from} options={siteOptions(choices.from)} />
        <SelectField name="toSiteId" label={words.form.to} options={siteOptions(choices.to)} />
        <Box row wrap gap="m">
          <DateField name="leftOn" label={words.form.leftOn} to={choices.today} />
          <DateField name="expectedOn" label={words.form.expectedOn} />
        </Box>
      </Card>
      <LoadLines choices={choices} control={draft.form.control} />
      <Card>
        <TextField name="reference" label={words.form.reference} hint={words.form.referenceHint} optional />
        <TextAreaField name="note" label={words.form.note} optional />
      </Card>
    </FormFrame>
  );
}

const siteOptions = (sites: Choices['to']) =>
  sites.map((site) => ({ value: site.id, label: `${site.company}: ${site.name}` }));
