import type { Tone } from '../theme/meaning';
import { text } from '@/shared/text/catalogue';

const words = text.shipments;

/** How a count stands to the declaration, in words and with the tone of its tag; above 0 more came. */
export function differenceOf(by: number): { tone: Tone; label: string } {
  if (by === 0) return { tone: 'done', label: words.asDeclared };
  return { tone: 'differs', label: by < 0 ? words.fewer(-by) : words.more(by) };
}
