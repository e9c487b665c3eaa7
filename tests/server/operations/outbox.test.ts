import { simpleParser } from 'mailparser';
import { createTransport } from 'nodemailer';
import { SMTPServer } from 'smtp-server';
import { inTransaction } from '@/db/transaction';
import { queueMail } from '@/server/mail/outbox';
import { type Mailer, sendWaiting } from '@/server/mail/send-waiting';
import { aProduct, type Product } from '../../support/app';

type Arrived = { messageId: string; recipients: string[]; subject: string; headers: string[]; text: string };

let product: Product;
let postOffice: SMTPServer;
let arrived: Arrived[] = [];
let mailer: NonNullable<Mailer>;

beforeAll(async () => {
  product = await aProduct('outbox');
  postOffice = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData: (stream, session, done) => {
      void simpleParser(stream).then((mail) => {
        arrived.push({
          messageId: mail.messageId ?? '',
          recipients: session.envelope.rcptTo.map(({ address }) => address),
          subject: mail.subject ?? '',
          headers: [...mail.headers.keys()],
          text: mail.text ?? '',
        });
        done();
      });
    },
  });
  await new Promise<void>((resolve) => postOffice.listen(0, '127.0.0.1', resolve));
  const address = postOffice.server.address();
  const port = typeof address === 'object' && address ? address.port : 0;
  mailer = createTransport({ host: '127.0.0.1', port, secure: false });
});
afterAll(async () => {
  await new Promise<void>((resolve) => postOffice.close(() => resolve()));
  await product.close();
});
beforeEach(async () => {
  arrived = [];
  product.setClock('2026-03-20T09:00:00.000Z');
  await product.deps.pool.query('DELETE FROM outbox');
});

const queue = (name: string, subject = 'Counted') =>
  inTransaction(product.deps.db, (tx) =>
    queueMail(tx, {
      to: { name, email: 'inge@kestrel.example' },
      now: '2026-03-20T09:00:00.000Z',
      kind: 'test',
      subject,
      text: '392 of 400 arrived',
    }),
  );
const states = async () =>
  (await product.deps.pool.query('SELECT state, attempts FROM outbox'))[0] as {
    state: string;
    attempts: number;
  }[];
/** A sender that gets as far as `until` and is never heard of again. */
const dies = (until: (mail: object) => Promise<unknown>): Mailer =>
  ({
    sendMail: async (mail: object) => {
      await until(mail);
      return new Promise(() => undefined);
    },
  }) as never;
const begun = (died: Promise<unknown>): Promise<unknown> =>
  Promise.race([died, new Promise((resolve) => setTimeout(resolve, 400))]);

describe('the outbox', () => {
  it('sends what a dead sender had claimed, once its lease is over and not before', async () => {
    await queue('Inge');
    await begun(
      sendWaiting(
        product.deps,
        dies(() => Promise.resolve()),
      ),
    );
    expect(await sendWaiting(product.deps, mailer)).toBe(0);
    product.setClock('2026-03-20T09:02:01.000Z');
    expect(await sendWaiting(product.deps, mailer)).toBe(1);
    expect(arrived).toHaveLength(1);
    expect(await states()).toEqual([{ state: 'sent', attempts: 1 }]);
  });

  it('repeats under the same Message-ID what was sent and not marked, and no more than once', async () => {
    await queue('Inge');
    await begun(
      sendWaiting(
        product.deps,
        dies((mail) => mailer.sendMail(mail)),
      ),
    );
    expect(arrived).toHaveLength(1);
    product.setClock('2026-03-20T09:02:01.000Z');
    await sendWaiting(product.deps, mailer);
    product.setClock('2026-03-20T12:00:00.000Z');
    await sendWaiting(product.deps, mailer);
    expect(arrived).toHaveLength(2);
    expect(arrived[1]?.messageId).toBe(arrived[0]?.messageId);
  });

  it('is emptied by several senders at once without a repeat', async () => {
    for (let n = 0; n < 30; n += 1) await queue(`Person ${n}`);
    while (
      (await Promise.all([1, 2, 3].map(() => sendWaiting(product.deps, mailer)))).some((sent) => sent > 0)
    );
    expect(new Set(arrived.map(({ messageId }) => messageId)).size).toBe(30);
    expect(arrived).toHaveLength(30);
  });

  it('keeps a letter that the post office refuses, and sends it later', async () => {
    await queue('Inge');
    const away = { sendMail: () => Promise.reject(new Error('connection refused')) } as never;
    await sendWaiting(product.deps, away);
    expect(await states()).toEqual([{ state: 'waiting', attempts: 1 }]);
    product.setClock('2026-03-20T10:00:00.000Z');
    await sendWaiting(product.deps, mailer);
    expect(await states()).toEqual([{ state: 'sent', attempts: 2 }]);
  });

  it.each([
    'Inge\r\nBcc: evil@evil.example',
    'Inge\nTo: evil@evil.example',
    'Inge" <evil@evil.example>, "x',
    'Inge\u2028Bcc: evil@evil.example',
  ])('reaches one recipient and gains no header by the name or subject %j', async (forged) => {
    await queue(forged, `Counted ${forged}`);
    await sendWaiting(product.deps, mailer);
    expect(arrived.map(({ recipients }) => recipients)).toEqual([['inge@kestrel.example']]);
    expect(arrived[0]?.headers).not.toContain('bcc');
    expect(arrived[0]?.headers.sort()).toEqual(
      [
        'content-transfer-encoding',
        'content-type',
        'date',
        'from',
        'message-id',
        'mime-version',
        'subject',
        'to',
      ].sort(),
    );
    expect(arrived[0]?.subject).toMatch(/^Counted Inge/);
  });
});
