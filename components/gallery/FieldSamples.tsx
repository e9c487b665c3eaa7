import { useState } from 'react';
import { z } from 'zod';
import { text } from '@/shared/text/catalogue';
import { ChoiceField, CheckboxField, DateField, FilesField, SelectField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { MoneyField, NumberField, TextAreaField, TextField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Text } from '../ui/Text';

const schema = z.object({
  reference: z.string().trim().min(1).max(40),
  counted: z.int().min(0),
  fee: z.string().regex(/^\d+(\.\d+)?$/),
  type: z.string().min(1),
  day: z.string().min(1),
  side: z.enum(['plant', 'partner']),
  overdue: z.boolean(),
  note: z.string().max(400),
});

const names = {
  side: ['plant', 'partner'],
  type: ['Tote 600×400×280', 'Lid 1200×800', 'Compressor rack'],
} as const;
const options = (labels: readonly string[]) => labels.map((label) => ({ value: label, label }));

export function FieldSamples() {
  const [open, setOpen] = useState(false);
  const draft = useDraftForm({
    name: 'gallery',
    schema,
    defaultValues: {
      reference: '',
      counted: 392,
      fee: '',
      type: '',
      day: '',
      side: 'plant',
      overdue: false,
      note: '',
    },
  });
  return (
    <Card title={text.gallery.inputs}>
      <FormFrame
        draft={draft}
        label={text.gallery.inputs}
        submitLabel="Send count"
        onSubmit={async () => announce('Counted. 8 fewer than declared.')}
        more={<Button kind="secondary" label="Open a dialog" onPress={() => setOpen(true)} />}
      >
        <TextField name="reference" label="Reference" hint="As it stands on the delivery note." />
        <NumberField
          name="counted"
          label="Tote 600×400×280"
          hint="declared 400 · 50 stacks of 8"
          steps
          large
        />
        <MoneyField name="fee" label="Daily fee" currency="EUR" optional />
        <SelectField name="type" label="Container type" options={options(names.type)} />
        <DateField name="day" label="Left on" />
        <ChoiceField name="side" label="Whose count stands" options={options(names.side)} />
        <CheckboxField name="overdue" label="Only what is overdue" />
        <TextAreaField name="note" label="What happened" />
        <FilesField name="photos" label="Photos" hint="A photo of the load helps when the numbers differ." />
      </FormFrame>
      <Dialog open={open} title="Decline with a reason" onClose={() => setOpen(false)}>
        <Text>The partner sees the reason.</Text>
        <Button label="Decline" onPress={() => setOpen(false)} />
      </Dialog>
    </Card>
  );
}
