import { z } from 'zod';
import { answerForm, type LineSubject, openingForm, replyToDispute } from '@/shared/contracts/disputes';
import { id, needed } from '@/shared/contracts/fields';

const files = z.array(z.object({ id, name: z.string(), mediaType: z.string() }));

/** What is typed and kept: the contract's forms, with the names of the files that are with the server. */
export const openingDraft = openingForm.safeExtend({ files });
/** A line disputed by units needs their number, one disputed in money the amount. */
export const lineDraft = ({ way }: Pick<LineSubject, 'way'>) =>
  way === null
    ? openingDraft.refine((form) => (form.tooMuch ?? '') !== '', needed('tooMuch'))
    : openingDraft.refine((form) => form.claimed !== undefined, needed('claimed'));
export const answerDraft = answerForm.safeExtend({ files });
export const replyDraft = replyToDispute.body!.safeExtend({ files });

/** The body that is sent: files by their ids. */
export function withFileIds<Values extends { files: { id: string }[]; fileIds: string[] }>({
  files: sent,
  ...rest
}: Values): Omit<Values, 'files'> {
  return { ...rest, fileIds: sent.map((file) => file.id) };
}
