import type { AnswerForm, DisputeDetail } from '@/shared/contracts/disputes';
import { amountOfUnits } from '@/shared/domain/disputed-line';
import { text } from '@/shared/text/catalogue';

const words = text.disputes.answer.effect;
type Typed = { step: AnswerForm['step']; units: unknown; amount: unknown };

/** What an answer does to the book and to money, in words, for what is typed so far. */
export function effectOf(dispute: DisputeDetail, typed: Typed): string {
  if (typed.step === 'ask') return words.ask;
  if (typed.step === 'decline') return words.decline;
  const whole = Math.abs(dispute.claimed - dispute.stated);
  const units = typed.step === 'accept' ? whole : typeof typed.units === 'number' ? typed.units : 0;
  const rest = typed.step === 'accept in part' ? ` ${words.part}` : '';
  return acceptanceOf(dispute, { units, typed }) + rest;
}

function acceptanceOf(dispute: DisputeDetail, { units, typed }: { units: number; typed: Typed }): string {
  const { claimed, stated, currency, component, lineAmount, amountClaimed } = dispute;
  if (dispute.subject === 'count') {
    const by = Math.sign(claimed - stated) * units;
    return words.count(by, stated + by);
  }
  if (claimed === stated) {
    const part = typeof typed.amount === 'string' && /^\d+(\.\d+)?$/.test(typed.amount) ? typed.amount : '0';
    return words.credit(typed.step === 'accept' ? amountClaimed : part, currency);
  }
  if (component === 'lost') return words.lost;
  const line = { component: component ?? 'credit', quantity: stated, amount: lineAmount ?? '0', currency };
  return words.credit(amountOfUnits(line, units), currency);
}
