import { readFile } from 'node:fs/promises';
import exceljs from 'exceljs';
import { addDays, firstDayOfMonth, monthOf } from '@/shared/domain/calendar';
import { formatMonth } from '@/shared/text/format';
import { counted, sent } from './support/movements';
import { theatre, type Theatre } from './support/journey';
import { lastMonth, today } from './support/scene';
import type { Visit } from './support/visit';

const { journey } = theatre('month_end');
const month = formatMonth(lastMonth());
/** The so-many-th day of the month that is over. */
const onDay = (day: number): string => addDays(firstDayOfMonth(lastMonth()), day - 1);

/** Last month: 400 totes to Kestrel on the 3rd, 150 of them back on the 20th; 100 to Orrin on the 10th. */
async function lastMonthsMovements({ stage, scene }: Theatre): Promise<void> {
  const { tarnby, kestrel, orrin } = scene.sites;
  const moves = [
    { contents: 'empties', from: tarnby, to: kestrel, units: 400, on: onDay(3) },
    { contents: 'empties', from: tarnby, to: orrin, units: 100, on: onDay(10) },
    { contents: 'fulls', from: kestrel, to: tarnby, units: 150, on: onDay(20) },
  ] as const;
  for (const { contents, from, to, units, on } of moves) {
    const load = { 'TOTE-64': units };
    const shipment = await sent(stage, { contents, from: from.id, to: to.id, load, on });
    await counted(stage, { shipment, load, on });
  }
}

async function downloaded(
  visit: Visit,
  press: () => Promise<void>,
): Promise<{ name: string; bytes: Buffer }> {
  const [download] = await Promise.all([visit.page.waitForEvent('download'), press()]);
  return { name: download.suggestedFilename(), bytes: await readFile(await download.path()) };
}

journey(
  'finance sets terms, closes the month once from two tabs, and issues the statements',
  async (theatre) => {
    const { at, scene } = theatre;
    await lastMonthsMovements(theatre);
    const mikkel = await at('desk', scene.people.mikkel);
    await mikkel.open(`/terms/${scene.companies.kestrel.id}`);
    await mikkel.arrives('Terms of Kestrel Coil Works');
    await mikkel.isInOrder();
    await mikkel.open(`/terms/${scene.companies.kestrel.id}/set?type=TOTE-64`);
    await mikkel.write('From', firstDayOfMonth(monthOf(today())));
    await mikkel.write(/^Deposit/, '5.00');
    await mikkel.isInOrder();
    await mikkel.press('Set these terms');
    await mikkel.arrives('Terms of Kestrel Coil Works');
    await mikkel.sees('5.00');

    const other = await at('desk', scene.people.mikkel);
    for (const tab of [mikkel, other]) {
      await tab.open('/months');
      await tab.follow(month);
      await tab.arrives(month);
    }
    await mikkel.sees('Nothing stands open.');
    await mikkel.isInOrder();
    await mikkel.press('Close the month');
    await mikkel.sees('Closed: Mikkel Thorn');
    await other.press('Close the month');
    await other.sees('This month is closed already. Nothing was changed.');
    await mikkel.one('button', 'Issue 2 drafts').waitFor();
    await mikkel.isInOrder();
    const all = await downloaded(mikkel, () => mikkel.follow('Download all spreadsheets'));
    expect(all.name).toMatch(/\.zip$/);
    expect(all.bytes.subarray(0, 2).toString('latin1')).toBe('PK');

    for (const tab of [mikkel, other]) {
      await tab.open(`/statements?month=${lastMonth()}`);
      await tab.follow('Kestrel Coil Works');
      await tab.arrives(month);
      await tab.sees('would be due');
    }
    await mikkel.isInOrder();
    await mikkel.press('Issue this statement');
    await mikkel.sees('waits for an answer');
    await other.press('Issue this statement');
    await other.sees('This statement went out already. Nothing was sent twice.');
    await mikkel.open(`/months/${lastMonth()}`);
    await mikkel.press('Issue 1 draft');
    await mikkel.sees('2 issued');
    const file = await downloadedStatement(mikkel);
    expect(file.sheets).toEqual([
      'Summary',
      'Containers',
      'Movements',
      'Money',
      'Corrections',
      'Open differences',
      'Terms',
    ]);
  },
);

async function downloadedStatement(visit: Visit): Promise<{ sheets: string[] }> {
  await visit.open(`/statements?month=${lastMonth()}`);
  await visit.follow('Kestrel Coil Works');
  await visit.arrives(month);
  const { bytes } = await downloaded(visit, () => visit.follow('Download spreadsheet'));
  const book = new exceljs.Workbook();
  await book.xlsx.load(bytes as never);
  return { sheets: book.worksheets.map((sheet) => sheet.name) };
}

journey(
  'the partner’s manager follows the mail to the statement and disputes a line; its amount is held',
  async ({ at, scene }) => {
    const jonas = await at('desk', scene.people.jonas);
    await jonas.open('/mail?search=rasmus');
    await jonas.follow(`Statement for ${month}`);
    const link = await jonas.page.getByText(/\/statements\//).innerText();

    const rasmus = await at('phone', scene.people.rasmus);
    await rasmus.open(new URL(link.trim()).pathname);
    await rasmus.arrives(month);
    await rasmus.sees('due now');
    await rasmus.sees(/1\s800\.00/);
    await rasmus.isInOrder();
    await rasmus.follow('Dispute Deposits asked');
    await rasmus.arrives('Dispute a line');
    await rasmus.write('How many do you say it should be?', '390');
    await rasmus.sees('10 fewer. EUR 45.00 is held back until this is decided.');
    await rasmus.pick('Why', 'It was counted wrongly');
    await rasmus.write('What happened', 'Ten were cracked and went straight back on the truck.');
    await rasmus.isInOrder();
    await rasmus.press('Send dispute');
    await rasmus.sees('The plant has the next word, since today.');
    await rasmus.open(new URL(link.trim()).pathname);
    await rasmus.sees('EUR 45.00 held: disputed');
    await rasmus.sees('10 of 400 disputed');
    await rasmus.isInOrder();
  },
);

journey('another partner’s manager confirms, and sees nothing of the first', async ({ at, scene }) => {
  const olaf = await at('desk', scene.people.olaf);
  await olaf.open('/');
  await olaf.arrives('Today');
  await olaf.isInOrder();
  await olaf.open('/statements');
  await olaf.follow(month);
  await olaf.arrives(month);
  expect(await olaf.page.getByText('Kestrel').count()).toBe(0);
  await olaf.press('Confirm this statement');
  await olaf.sees('confirmed');
  await olaf.isInOrder();
});

journey(
  'finance accepts the dispute: nothing is held any more, and the credit waits for the next statement',
  async ({ at, scene }) => {
    const mikkel = await at('desk', scene.people.mikkel);
    await mikkel.open('/');
    await mikkel.arrives('Today');
    await mikkel.isInOrder();
    await mikkel.open('/disputes');
    await mikkel.follow(/Deposits asked/);
    await mikkel.field('Accept in whole').check();
    await mikkel.write('What do you tell them?', 'Agreed, the driver says the same.');
    await mikkel.isInOrder();
    await mikkel.press('Send answer');
    await mikkel.sees(/10 of 10 accepted/);
    const rasmus = await at('phone', scene.people.rasmus);
    await rasmus.open('/statements');
    await rasmus.isInOrder();
    await rasmus.follow(month);
    await rasmus.arrives(month);
    expect(await rasmus.page.getByText('held: disputed').count()).toBe(0);
  },
);

journey('nothing is posted into the closed month, and what was typed stays', async ({ at, scene }) => {
  const ane = await at('desk', scene.people.ane);
  await ane.open('/balances/adjust');
  await ane.arrives('Adjust stock');
  await ane.pick('What happened', 'found: more there than the book says');
  await ane.pick('Site', 'Fennmark Heat Pumps: Tarnby Assembly');
  await ane.pick('Container type', 'Tote 600×400×280');
  await ane.write('Units', '4');
  await ane.write('On', onDay(25));
  await ane.write('Reason', 'Found behind the washing line.');
  await ane.press('Book it');
  await ane.sees(
    'This month is closed. Date it in an open month; what was wrong in a closed one is settled as a correction.',
  );
  expect(await ane.field('Reason').inputValue()).toBe('Found behind the washing line.');
  await ane.isInOrder();
  await ane.write('On', today());
  await ane.press('Book it');
  await ane.sees(/Booked 4 under entry/);
});
