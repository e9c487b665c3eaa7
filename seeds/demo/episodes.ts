import { and, eq } from 'drizzle-orm';
import { differences } from '@/db/schema/differences';
import { settleDifference } from '@/server/modules/differences/settle-difference';
import { addDays } from '@/shared/domain/calendar';
import type { Book, Underway } from './book';

type Line = { typeCode: string; declared: number };
type Lane = { fromSite: string; toSite: string; lines: Line[] };
const asCounted = (typeCode: string, counted: number) => ({ typeCode, counted, damaged: 0, dirty: 0 });

/** What waits for somebody on the demo's last days: each kind of difference once, and two deliveries to count. */
export async function playEpisodes(book: Book, today: string): Promise<void> {
  const back = (days: number): string => addDays(today, -days);
  const send = (leftOn: string, arrivesOn: string, lane: Lane): Promise<Underway> =>
    book.onDay((tx) => book.send(tx, { leftOn, arrivesOn, ...lane }));
  const count = (underway: Underway, on: string, lines: ReturnType<typeof asCounted>[]) =>
    book.onDay((tx) => book.count(tx, { underway, on, lines }));

  await send(back(11), back(10), {
    fromSite: 'ORRIN',
    toSite: 'TARNBY',
    lines: [{ typeCode: 'BOX-1210', declared: 60 }],
  });

  const fewer = await send(back(5), back(4), {
    fromSite: 'TARNBY',
    toSite: 'KESTREL',
    lines: [
      { typeCode: 'TOTE-64', declared: 400 },
      { typeCode: 'LID-128', declared: 20 },
    ],
  });
  await count(fewer, back(4), [asCounted('TOTE-64', 392), asCounted('LID-128', 20)]);

  const swapped = await send(back(3), back(2), {
    fromSite: 'SUNDHOLM',
    toSite: 'OSTREL',
    lines: [{ typeCode: 'RACK-CP', declared: 6 }],
  });
  await count(swapped, back(2), [asCounted('RACK-CP', 4), asCounted('BOX-1210', 2)]);

  await splitDelivery(book, { today, send, count });

  const bare = await book.onDay((tx) =>
    book.send(tx, {
      fromSite: 'PALLWICK',
      toSite: 'OSTREL',
      leftOn: back(1),
      arrivesOn: back(1),
      lines: [],
      origin: 'unannounced',
    }),
  );
  await count(bare, back(1), [asCounted('TOTE-43', 24)]);

  await send(back(1), today, {
    fromSite: 'TARNBY',
    toSite: 'KESTREL',
    lines: [
      { typeCode: 'TOTE-64', declared: 400 },
      { typeCode: 'LID-128', declared: 20 },
      { typeCode: 'PALLET-128', declared: 20 },
    ],
  });
  await send(today, addDays(today, 1), {
    fromSite: 'OSTREL',
    toSite: 'KESTREL',
    lines: [{ typeCode: 'BOX-1210', declared: 2 }],
  });
}

type Acts = {
  today: string;
  send: (leftOn: string, arrivesOn: string, lane: Lane) => Promise<Underway>;
  count: (underway: Underway, on: string, lines: ReturnType<typeof asCounted>[]) => Promise<unknown>;
};

/** One shipment that came in two halves: the second turned up the day after. */
async function splitDelivery(book: Book, { today, send, count }: Acts): Promise<void> {
  const halves = await send(addDays(today, -9), addDays(today, -8), {
    fromSite: 'OSTREL',
    toSite: 'MAREN',
    lines: [{ typeCode: 'TOTE-43', declared: 160 }],
  });
  await count(halves, addDays(today, -8), [asCounted('TOTE-43', 80)]);
  const on = addDays(today, -7);
  await book.onDay(async (tx) => {
    const [open] = await tx
      .select({ id: differences.id })
      .from(differences)
      .where(and(eq(differences.shipmentId, halves.id), eq(differences.state, 'open')));
    if (!open) throw new Error('the first half opened no difference');
    await settleDifference(tx, {
      differenceId: open.id,
      way: 'turned up later',
      units: 80,
      reason: 'The second truck of the same shipment.',
      personId: book.cast.personIds.get('ane@fennmark.example') ?? null,
      today: on,
      now: `${on}T11:05:00.000Z`,
    });
  });
}
