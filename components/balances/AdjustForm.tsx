import { useWatch } from 'react-hook-form';
import { z } from 'zod';
import {
  adjustmentForm,
  adjustmentKinds,
  adjustStock,
  type listAdjustmentChoices,
} from '@/shared/contracts/balances';
import type { AnswerOf } from '@/shared/contracts/operation';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { DateField, SelectField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { NumberField, TextAreaField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';

const words = text.balances;

export type Booked = AnswerOf<typeof adjustStock>;
type Choices = AnswerOf<typeof listAdjustmentChoices>;
/** Nothing chosen is told as that, before the shape of a code is looked at. */
const adjustDraft = adjustmentForm.extend({
  typeCode: z.string().min(1, text.fields.choose).pipe(adjustmentForm.shape.typeCode),
});

type Props = { choices: Choices; onBooked: (booked: Booked) => void };

export function AdjustForm({ choices, onBooked }: Props) {
  const post = usePost(adjustStock, { refreshes: ['today', 'shipments'] });
  const draft = useDraftForm({
    schema: adjustDraft,
    name: 'adjust stock',
    defaultValues: { siteId: '', typeCode: '', on: choices.today, reason: '' },
  });
  const siteId = useWatch({ control: draft.form.control, name: 'siteId' });
  const site = choices.sites.find((each) => each.id === siteId);
  return (
    <FormFrame
      draft={draft}
      label={words.adjust}
      onSubmit={async (body) => onBooked(await post.mutateAsync({ body }))}
      submitLabel={words.form.submit}
      inBar
    >
      <Card>
        <SelectField
          name="kind"
          label={words.form.kind}
          options={adjustmentKinds.map((kind) => ({ value: kind, label: words.kind[kind] }))}
        />
        <SelectField
          name="siteId"
          label={words.form.site}
          options={choices.sites.map(({ id, name, company }) => ({
            value: id,
            label: `${company}: ${name}`,
          }))}
        />
        {site && !site.own ? <Notice kind="caution">{words.partnerNote}</Notice> : null}
        <SelectField
          name="typeCode"
          label={words.form.type}
          options={choices.types.map((type) => ({ value: type.code, label: type.name }))}
        />
        <NumberField name="units" label={words.form.units} steps least={1} />
        <DateField name="on" label={words.form.on} to={choices.today} />
        <TextAreaField name="reason" label={words.form.reason} hint={words.form.reasonHint} />
      </Card>
    </FormFrame>
  );
}
