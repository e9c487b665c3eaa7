import { and, desc, eq } from 'drizzle-orm';
import { disputeMessages } from '@/db/schema/differences';
import { statementLines, statements } from '@/db/schema/statements';
import { adjustStock } from '@/server/modules/balances/adjust-stock';
import { answerDispute } from '@/server/modules/disputes/answer-dispute';
import { openDispute } from '@/server/modules/disputes/open-dispute';
import type { AnswerForm, OpeningForm } from '@/shared/contracts/disputes';
import { addDays } from '@/shared/domain/calendar';
import type { Book } from './book';
import { depsOn, personNamed } from './month-end';

type Word = { email: string; on: string };
const at = (on: string): string => `${on}T14:25:00.000Z`;

async function open(book: Book, { email, on }: Word, form: Omit<OpeningForm, 'fileIds'>): Promise<string> {
  const person = await personNamed(book, email);
  const { config } = depsOn(book, at(on));
  return book.onDay(async (tx) => {
    const opened = await openDispute(tx, {
      form: { ...form, fileIds: [] },
      person,
      now: at(on),
      publicUrl: config.PUBLIC_URL,
    });
    return opened.id;
  });
}

async function answer(
  book: Book,
  {
    disputeId,
    on,
    ...said
  }: { disputeId: string; on: string } & Omit<AnswerForm, 'fileIds' | 'seenMessageId'>,
): Promise<void> {
  const person = await personNamed(book, 'ane@fennmark.example');
  const { config } = depsOn(book, at(on));
  await book.onDay(async (tx) => {
    const [last] = await tx
      .select({ id: disputeMessages.id })
      .from(disputeMessages)
      .where(eq(disputeMessages.disputeId, disputeId))
      .orderBy(desc(disputeMessages.id))
      .limit(1);
    const form = { ...said, fileIds: [], seenMessageId: last?.id ?? '' };
    await answerDispute(tx, { disputeId, form, person, now: at(on), publicUrl: config.PUBLIC_URL });
  });
}

/** A shipment of fulls that the plant counted short. */
async function countedShort(
  book: Book,
  asked: { from: string; to: string; typeCode: string; declared: number; counted: number; leftOn: string },
): Promise<string> {
  const { from, to, typeCode, declared, counted, leftOn } = asked;
  const arrivesOn = addDays(leftOn, 1);
  return book.onDay(async (tx) => {
    const underway = await book.send(tx, {
      fromSite: from,
      toSite: to,
      leftOn,
      arrivesOn,
      lines: [{ typeCode, declared }],
    });
    await book.count(tx, { underway, on: arrivesOn, lines: [{ typeCode, counted, damaged: 0, dirty: 0 }] });
    return underway.id;
  });
}

/** Three disputes over counts, each in another state: open, waiting for the partner, accepted in part. */
export async function playDisputes(book: Book, today: string): Promise<void> {
  const back = (days: number): string => addDays(today, -days);
  const kestrel = await countedShort(book, {
    from: 'KESTREL',
    to: 'TARNBY',
    typeCode: 'TOTE-64',
    declared: 320,
    counted: 312,
    leftOn: back(7),
  });
  await open(
    book,
    { email: 'inge@kestrel.example', on: back(5) },
    {
      subject: 'count',
      shipmentId: kestrel,
      typeCode: 'TOTE-64',
      claimed: 320,
      reason: 'counted wrongly',
      text: 'We loaded 40 stacks of 8 and the driver signed for them. One stack stood behind the rack at your gate.',
    },
  );
  const maren = await countedShort(book, {
    from: 'MAREN',
    to: 'OSTREL',
    typeCode: 'TOTE-43',
    declared: 80,
    counted: 68,
    leftOn: back(8),
  });
  const asked = await open(
    book,
    { email: 'nanna@maren.example', on: back(6) },
    {
      subject: 'count',
      shipmentId: maren,
      typeCode: 'TOTE-43',
      claimed: 80,
      reason: 'counted wrongly',
      text: 'Eighty went out, two layers of forty.',
    },
  );
  await answer(book, {
    disputeId: asked,
    on: back(4),
    step: 'ask',
    text: 'Please add the signed note: our dock has a photo of 68.',
  });
  const sundholm = await countedShort(book, {
    from: 'SUNDHOLM',
    to: 'OSTREL',
    typeCode: 'RACK-CP',
    declared: 12,
    counted: 8,
    leftOn: back(12),
  });
  const parted = await open(
    book,
    { email: 'per@sundholm.example', on: back(10) },
    {
      subject: 'count',
      shipmentId: sundholm,
      typeCode: 'RACK-CP',
      claimed: 12,
      reason: 'counted wrongly',
      text: 'All twelve were on the two trucks.',
    },
  );
  await answer(book, {
    disputeId: parted,
    on: back(8),
    step: 'accept in part',
    units: 2,
    text: 'Two stood in the cold hall. The other two never came off the truck.',
  });
}

/** A load of fulls from Kestrel, counted 8 short in a month that closes soon after. */
export function countShortBeforeClose(book: Book, leftOn: string): Promise<string> {
  return countedShort(book, {
    from: 'KESTREL',
    to: 'TARNBY',
    typeCode: 'TOTE-64',
    declared: 400,
    counted: 392,
    leftOn,
  });
}

/** After the close the count is disputed and put right: the next statement carries the correction. */
export async function putRightAfterClose(
  book: Book,
  { shipmentId, on }: { shipmentId: string; on: string },
): Promise<void> {
  const disputeId = await open(
    book,
    { email: 'inge@kestrel.example', on },
    {
      subject: 'count',
      shipmentId,
      typeCode: 'TOTE-64',
      claimed: 400,
      reason: 'counted wrongly',
      text: 'The note signed at your gate says 400.',
    },
  );
  await answer(book, {
    disputeId,
    on: addDays(on, 2),
    step: 'accept',
    text: 'The gate has the same note. We put the count right.',
  });
}

/** Twelve totes that a stocktake at Kestrel did not find. */
export async function loseAtKestrel(book: Book, on: string): Promise<void> {
  await book.onDay((tx) =>
    adjustStock(tx, {
      siteId: book.siteId('KESTREL'),
      typeCode: 'TOTE-64',
      kind: 'lost',
      units: 12,
      on,
      reason: 'Not found at the count of the whole hall.',
      personId: book.cast.personIds.get('ane@fennmark.example') ?? null,
      now: `${on}T15:00:00.000Z`,
    }),
  );
}

/** Kestrel's manager disputes five of the twelve lost totes on the statement. */
export async function disputeLoss(book: Book, { month, on }: { month: string; on: string }): Promise<void> {
  const [line] = await book.db
    .select({ id: statementLines.id })
    .from(statementLines)
    .innerJoin(statements, eq(statements.id, statementLines.statementId))
    .where(
      and(
        eq(statements.companyId, book.cast.companyIds.get('KESTREL') ?? ''),
        eq(statements.month, month),
        eq(statementLines.component, 'lost'),
        eq(statementLines.accountMonth, month),
      ),
    );
  if (!line) throw new Error(`Kestrel’s statement of ${month} has no line for what was lost`);
  await open(
    book,
    { email: 'rasmus@kestrel.example', on },
    {
      subject: 'statement line',
      lineId: line.id,
      claimed: 7,
      reason: 'sent them back',
      text: 'Five of the twelve came back under the foam trays. The driver signed for them.',
    },
  );
}
