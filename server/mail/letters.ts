import { mail } from '@/shared/text/en/mail';
import type { Letter } from './outbox';

/** Puts the paragraphs of a message together. */
export function letterOf(
  kind: string,
  subject: string,
  paragraphs: { name: string; parts: readonly string[] },
): Letter {
  return {
    kind,
    subject,
    text: [mail.greeting(paragraphs.name), ...paragraphs.parts, mail.closing].join('\n\n'),
  };
}

export function resetMail({ name, link }: { name: string; link: string }): Letter {
  return letterOf('reset link', mail.reset.subject, {
    name,
    parts: [mail.reset.text, link, mail.reset.otherwise],
  });
}

export function invitationMail(to: { name: string; link: string; by: string; company: string }): Letter {
  const { name, link, by, company } = to;
  return letterOf('invitation', mail.invitation.subject(company), {
    name,
    parts: [mail.invitation.text(by, company), link],
  });
}
