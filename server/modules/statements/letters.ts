import { statements as words } from '@/shared/text/en/statements';
import { formatMoney } from '@/shared/text/format';
import { letterOf } from '../../mail/letters';
import type { Letter } from '../../mail/outbox';

type Issued = {
  operator: string;
  month: string;
  total: string;
  currency: string;
  answerBy: string;
  link: string;
};

/** Tells a partner's managers that a statement is there to be answered. */
export function issuedMail(issued: Issued): (name: string) => Letter {
  const total = formatMoney(issued.total, issued.currency);
  return (name) =>
    letterOf('statement issued', words.mail.issuedSubject(issued.month), {
      name,
      parts: [
        words.mail.issuedText(issued.operator, issued.month, total),
        issued.link,
        words.mail.issuedUntil(issued.answerBy),
      ],
    });
}

/** Three days before silence counts as confirmed. */
export function reminderMail(waiting: {
  month: string;
  answerBy: string;
  link: string;
}): (name: string) => Letter {
  return (name) =>
    letterOf('statement reminder', words.mail.reminderSubject(waiting.month), {
      name,
      parts: [words.mail.reminderText(waiting.month, waiting.answerBy), waiting.link],
    });
}
