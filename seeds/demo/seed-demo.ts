import { eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { outbox } from '@/db/schema/work';
import { outsideAccount, siteAccount } from '@/server/modules/ledger/accounts';
import { postEntry } from '@/server/modules/ledger/post-entry';
import { addDays, firstDayOfMonth, lastDayOfMonth, monthOf, previousMonth } from '@/shared/domain/calendar';
import { approvePools } from './approve-pools';
import { bookOf } from './book';
import {
  countShortBeforeClose,
  disputeLoss,
  loseAtKestrel,
  playDisputes,
  putRightAfterClose,
} from './disputes';
import { playEpisodes } from './episodes';
import { endMonth } from './month-end';
import { drawsFrom } from './random';
import { companies } from './scenario-companies';
import { openingStock } from './scenario-lanes';
import { changeStock, liveDay, type World } from './simulate';
import { writeScenario } from './write-scenario';

export type Demo = { today: string; say: (line: string) => void };

/**
 * Six months of the scenario up to today, the same at every run of the same day: four closed months with statements,
 * one to be closed, and the days since. The last week keeps its differences open.
 */
export async function seedDemo(db: Database, { today, say }: Demo): Promise<void> {
  const openMonth = monthOf(addDays(today, -15));
  const firstMonth = backBy(openMonth, 4);
  const opened = firstDayOfMonth(firstMonth);
  const cast = await db.transaction((tx) =>
    writeScenario(tx, { on: opened, rateChangeOn: `${backBy(openMonth, 1)}-15` }),
  );
  const world: World = {
    book: bookOf(db, cast),
    draws: drawsFrom(20_261_201),
    stock: new Map(),
    underway: [],
  };
  await openTheBook(world, opened);
  const lastClosed = backBy(openMonth, 1);
  let counted = '';
  for (let day = opened; day <= today; day = addDays(day, 1)) {
    await liveDay(world, day, { settle: day <= addDays(today, -8) });
    if (day === `${previousMonth(lastClosed)}-23`) counted = await countShortBeforeClose(world.book, day);
    if (day === `${lastClosed}-08`) await putRightAfterClose(world.book, { shipmentId: counted, on: day });
    if (day === `${lastClosed}-20`) await loseAtKestrel(world.book, day);
    if (day.endsWith('-04')) await turnOfMonth(world, { day, openMonth, lastClosed });
    if (day === lastDayOfMonth(day.slice(0, 7))) say(`moved through ${monthOf(day)}`);
  }
  await approvePools(world.book, { on: today });
  await disputeLoss(world.book, { month: lastClosed, on: `${openMonth}-10` });
  await playEpisodes(world.book, today);
  await playDisputes(world.book, today);
  await captureLetters(db, `${today}T05:00:00.000Z`);
}

/** On the fourth of the month finance ends the one before; Kestrel and Orrin have not answered the latest yet. */
async function turnOfMonth(
  world: World,
  { day, openMonth, lastClosed }: { day: string; openMonth: string; lastClosed: string },
): Promise<void> {
  const month = previousMonth(monthOf(day));
  if (month >= openMonth || month < backBy(openMonth, 4)) return;
  await endMonth(world.book, {
    month,
    on: day,
    unanswered: month === lastClosed ? ['KESTREL', 'ORRIN'] : [],
  });
}

/** The demo's letters were written in the past: they are there to be read, and none of them goes out. */
async function captureLetters(db: Database, sentAt: string): Promise<void> {
  await db.update(outbox).set({ state: 'captured', sentAt }).where(eq(outbox.state, 'waiting'));
}

function backBy(month: string, months: number): string {
  return months === 0 ? month : backBy(previousMonth(month), months - 1);
}

/** The plants' stock on the first day, from the opening account. */
async function openTheBook(world: World, on: string): Promise<void> {
  const { book } = world;
  const operator = companies.find((company) => company.kind === 'operator');
  await book.onDay(async (tx) => {
    const opening = await outsideAccount(tx, 'opening');
    for (const { site, typeCode, units } of openingStock) {
      const to = await siteAccount(tx, {
        id: book.siteId(site),
        companyId: book.cast.companyIds.get(operator?.code ?? '') ?? '',
      });
      await postEntry(tx, {
        kind: 'opening',
        valueDate: on,
        moves: [{ typeCode, from: opening, to, units }],
        reason: 'Counted when the book was opened',
        personId: book.handOf(site),
      });
      changeStock(world, { site, typeCode }, units);
    }
  });
}
