import { and, asc, eq, isNull, lt, lte, or } from 'drizzle-orm';
import { createTransport, type Transporter } from 'nodemailer';
import { outbox } from '@/db/schema/work';
import { inTransaction } from '@/db/transaction';
import type { Deps } from '../deps';
import { instantOf } from '../deps';

export type Mailer = Pick<Transporter, 'sendMail'> | null;
const leaseMs = 120_000;
const mostAttempts = 8;

/** The transport of SMTP_URL; without one, messages are captured for the administrator to read. */
export function mailerOf(smtpUrl: string | undefined): Mailer {
  return smtpUrl ? createTransport(smtpUrl) : null;
}

/** A link that lets someone in is kept no longer than it is needed. */
const withoutLinks = (text: string): string => text.replace(/token=[\w-]+/g, 'token=…');

type Message = typeof outbox.$inferSelect;

/** Sends what waits: claim under a lease, commit, send, mark. A repeat after a crash carries the same Message-ID. */
export async function sendWaiting(deps: Deps, mailer: Mailer): Promise<number> {
  const claimed = await claim(deps);
  for (const message of claimed) await deliver(deps, { mailer, message });
  return claimed.length;
}

async function claim(deps: Deps): Promise<Message[]> {
  const now = instantOf(deps.clock);
  return inTransaction(deps.db, async (tx) => {
    const waiting = await tx
      .select()
      .from(outbox)
      .where(
        and(
          eq(outbox.state, 'waiting'),
          lte(outbox.notBefore, now),
          or(isNull(outbox.claimedUntil), lt(outbox.claimedUntil, now)),
        ),
      )
      .orderBy(asc(outbox.notBefore))
      .limit(20)
      .for('update', { skipLocked: true });
    const claimedUntil = new Date(Date.parse(now) + leaseMs).toISOString();
    for (const message of waiting) {
      await tx.update(outbox).set({ claimedUntil }).where(eq(outbox.id, message.id));
    }
    return waiting;
  });
}

async function deliver(deps: Deps, { mailer, message }: { mailer: Mailer; message: Message }): Promise<void> {
  const mark = (set: Partial<Message>) => deps.db.update(outbox).set(set).where(eq(outbox.id, message.id));
  if (!mailer) {
    await mark({ state: 'captured', sentAt: instantOf(deps.clock), claimedUntil: null });
    return;
  }
  try {
    await mailer.sendMail({
      from: { name: 'Tarekeep', address: deps.config.MAIL_FROM },
      to: { name: message.toName, address: message.toAddress },
      subject: message.subject,
      text: message.text,
      messageId: message.messageId,
    });
    await mark({
      state: 'sent',
      text: withoutLinks(message.text),
      sentAt: instantOf(deps.clock),
      claimedUntil: null,
      attempts: message.attempts + 1,
    });
  } catch (error) {
    const attempts = message.attempts + 1;
    const problem = (error instanceof Error ? error.message : String(error)).slice(0, 300);
    const wait = Math.min(3_600_000, 30_000 * 2 ** attempts);
    const notBefore = new Date(deps.clock.now().getTime() + wait).toISOString();
    deps.logger.warn({ err: error, message: message.id }, 'mail not sent');
    const givenUp = attempts >= mostAttempts;
    await mark({
      state: givenUp ? 'failed' : 'waiting',
      ...(givenUp ? { text: withoutLinks(message.text) } : {}),
      attempts,
      problem,
      notBefore,
      claimedUntil: null,
    });
  }
}
