import { z } from 'zod';
import type { ShipmentDetail } from '@/shared/contracts/shipments';
import { countForm } from '@/shared/contracts/shipments';
import { id } from '@/shared/contracts/fields';
import { text } from '@/shared/text/catalogue';
import { newId } from '../data/new-id';

const line = countForm.shape.lines.element.superRefine((value, context) => {
  if (value.counted >= 0 && value.damaged > value.counted)
    context.addIssue({ code: 'custom', path: ['damaged'], message: text.shipments.moreDamaged });
  if (value.counted >= 0 && value.dirty > value.counted)
    context.addIssue({ code: 'custom', path: ['dirty'], message: text.shipments.moreDirty });
});

/** What is typed on the count screen and kept: the contract's form, with the photos' names and the key of the sending. */
export const countDraft = z.object({
  lines: z.array(line),
  note: countForm.shape.note,
  photos: z.array(z.object({ id, name: z.string(), mediaType: z.string() })),
  /** Kept with what was typed, so that a sending repeated after a reload counts once. */
  key: z.string(),
});
export type CountDraft = z.output<typeof countDraft>;

/** Nothing is counted yet. */
export function emptyCount(shipment: Pick<ShipmentDetail, 'lines'>) {
  return {
    lines: shipment.lines.map(({ typeCode }) => ({ typeCode, damaged: 0, dirty: 0 })),
    note: '',
    photos: [],
    key: newId(),
  };
}

export type TypedLine = {
  typeCode: string;
  counted?: number | string | null;
  damaged?: number | string | null;
  dirty?: number | string | null;
};

/** Whether something is written for a line; what is no number is told at its field when it is sent. */
export const isCounted = ({ counted }: TypedLine): boolean =>
  counted !== undefined && counted !== null && counted !== '';
