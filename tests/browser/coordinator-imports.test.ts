import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { asOwner } from '../support/database';
import { aMonthInSmall, csvUpload } from './support/month-csv';
import { bothDevices, theatre } from './support/journey';
import { aPretender } from './support/papers';

const { journey } = theatre('imports');

journey(
  'a coordinator brings in a month, sees each bad row named, posts the rest and decides a suggestion',
  async ({ at, stage, scene }) => {
    const ane = await at('desk', scene.people.ane);
    await ane.open('/imports');
    await ane.sees('No file has been brought in yet');
    await ane.isInOrder();
    await ane.follow('Bring in a file');
    await ane.arrives('Bring in a file');
    await ane.isInOrder();
    await ane.press('Read the file');
    await ane.sees('Choose the file first.');
    await ane.field('+ file: The file').setInputFiles(aMonthInSmall());
    await ane.press('Read the file');
    await ane.arrives('november.csv');
    await ane.sees('3 rows cannot be posted, 125 rows can.');
    await ane.sees('Container type: “TOTE-99” is no container type of the book.');
    await ane.sees('Units: 12.5 is not whole.');
    await ane.sees('Units: -4 is below 0.');
    await ane.isInOrder();
    const stored = () =>
      asOwner(stage.database.name, async (owner) => {
        const [rows] = await owner.query('SELECT id FROM shipments');
        return (rows as unknown[]).length;
      });
    expect(await stored()).toBe(0);

    await ane.press('Post 125 rows');
    await ane.sees(/^Say first that/);
    await ane.field('Leave out 3 rows').check();
    await ane.press('Post 125 rows');
    await ane.one('progressbar', 'Shipments and receipts').waitFor();
    await ane.open('/shipments');
    await ane.arrives('Shipments');
    await ane.open('/imports');
    await ane.follow(/november\.csv/);
    await ane.sees(/Confirmed by Ane Ravn/);
    await ane.isInOrder();
    expect(await stored()).toBe(123);
    await ane.follow('Same reference');
    await ane.sees('8 fewer than declared');
    await ane.isInOrder();
    await ane.page.goBack();
    await ane.follow('Open: Suggestions');
    await ane.arrives('Suggestions');
    await ane.isInOrder();
    await ane.field(/^F-2 with /).check();
    await ane.press('Accept 1');
    await ane.sees('1 suggestion decided.');
    await ane.open('/shipments?search=F-2');
    await ane.sees('counted');
  },
);

for (const device of bothDevices) {
  journey(
    `at the ${device} a file that is not what its name says, or too large, is refused and nothing is stored`,
    async ({ at, scene }) => {
      const ane = await at(device, scene.people.ane);
      await ane.open('/imports/new');
      const file = () => ane.field('+ file: The file');
      await file().setInputFiles(aPretender('november.xlsx', 'application/vnd.ms-excel'));
      await ane.press('Read the file');
      await ane.sees('The file is not what its name says.');
      await ane.isInOrder();
      await ane.press('Remove november.xlsx');
      await file().setInputFiles(csvUpload('empty.csv', []));
      await ane.press('Read the file');
      await ane.sees('There are no rows below the heads. Nothing was stored.');
      await ane.press('Remove empty.csv');
      const folder = mkdtempSync(path.join(tmpdir(), 'tarekeep-large-'));
      for (const megabytes of [11, 50]) {
        const large = path.join(folder, `${megabytes}.csv`);
        writeFileSync(large, Buffer.alloc(megabytes * 1_000_000, 0x3b));
        await file().setInputFiles(large);
        await ane.sees(`${megabytes}.csv is larger than 10 MB, so it was not added.`);
      }
      rmSync(folder, { recursive: true });
      await file().setInputFiles(
        csvUpload('one.csv', [{ side: 'shipment', reference: 'H-1', daysAgo: 1, units: 8 }]),
      );
      await ane.press('Read the file');
      await ane.sees('All 1 row can be posted.');
      await ane.press('Put the file aside');
      await ane.arrives('Imports');
      await ane.sees('one.csv');
      await ane.isInOrder();
    },
  );
}

journey('50 MB sent past the form are refused by the server, which goes on', async ({ at, scene }) => {
  const ane = await at('desk', scene.people.ane);
  const { request } = ane.context;
  const { csrfToken } = (await (await request.get('/api/session')).json()) as { csrfToken: string };
  const answer = await request
    .post('/api/imports', {
      headers: { 'x-csrf-token': csrfToken, 'idempotency-key': '0191d2a0-0000-4000-8000-000000000001' },
      multipart: {
        file: { name: 'huge.csv', mimeType: 'text/csv', buffer: Buffer.alloc(50_000_000, 0x3b) },
      },
    })
    .then(
      async (response) => ({ status: response.status(), body: (await response.json()) as { code: string } }),
      () => 'cut off',
    );
  // The server may close before all has been sent, which a client sees as a broken connection.
  if (answer !== 'cut off') expect(answer).toMatchObject({ status: 413, body: { code: 'too large' } });
  await ane.open('/imports');
  await ane.arrives('Imports');
  expect(await ane.page.getByText('huge.csv').count()).toBe(0);
});
