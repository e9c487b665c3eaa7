import { z } from 'zod';
import { mostLines, sendingForm } from '@/shared/contracts/shipments';
import { addDays } from '@/shared/domain/calendar';
import { text } from '@/shared/text/catalogue';

const line = sendingForm.shape.lines.element;

/** The contract's form as it is typed: a reference left empty is none, a type not chosen is told as that. */
export const sendDraft = sendingForm.extend({
  lines: z
    .array(line.extend({ typeCode: z.string().min(1, text.fields.choose).pipe(line.shape.typeCode) }))
    .min(1)
    .max(mostLines),
  reference: z.union([z.literal(''), sendingForm.shape.reference.unwrap()]),
});
export type SendDraft = z.output<typeof sendDraft>;

type Start = { today: string; from: readonly { id: string }[]; to: readonly { id: string }[] };

/** Leaves today and is expected tomorrow; where there is one site to choose, it is chosen. */
export function emptySending({ today, from, to }: Start) {
  return {
    reference: '',
    fromSiteId: from[0]?.id ?? '',
    toSiteId: to.length === 1 ? (to[0]?.id ?? '') : '',
    leftOn: today,
    expectedOn: addDays(today, 1),
    lines: [{ typeCode: '' }],
    note: '',
  };
}
