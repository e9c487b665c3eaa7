import { asOwner } from '../support/database';
import { testPassword } from '../support/builders';
import { counted, emptiesToKestrel, sent } from './support/movements';
import { theatre, type Theatre } from './support/journey';
import { aLargeFile, aPaper, aPhoto, aPretender } from './support/papers';

const { journey } = theatre('bad_counts');
const tote = 'Tote 600×400×280';

async function openedCount({ at, stage, scene }: Theatre) {
  const shipment = await emptiesToKestrel({ stage, scene }, { 'TOTE-64': 400 });
  const inge = await at('phone', scene.people.inge);
  await inge.open(`/shipments/${shipment.id}/count`);
  await inge.press(`Other number, or damaged: ${tote}`);
  return { shipment, inge };
}

/** How many counts the book has of a shipment. */
const countsOf = ({ stage }: Theatre, shipment: { id: string }): Promise<number> =>
  asOwner(stage.database.name, async (owner) => {
    const [rows] = await owner.query('SELECT id FROM counts WHERE shipment_id = ?', [shipment.id]);
    return (rows as unknown[]).length;
  });

journey(
  'a negative and a fractional count are refused at their field, and what was typed stays',
  async (theatre) => {
    const { inge, shipment } = await openedCount(theatre);
    const notWhole = 'Write a whole number, like 392.';
    for (const [typed, said] of [
      ['-5', 'Not below 0.'],
      ['3.5', notWhole],
      ['many', notWhole],
    ] as const) {
      await inge.write(`${tote}, counted`, typed);
      await inge.press('Send count');
      await inge.sees(said);
      expect(await inge.field(`${tote}, counted`).inputValue()).toBe(typed);
    }
    await inge.isInOrder();
    expect(await countsOf(theatre, shipment)).toBe(0);
  },
);

journey('more damaged than counted is refused at its field', async (theatre) => {
  const { inge, shipment } = await openedCount(theatre);
  await inge.write(`${tote}, counted`, '10');
  await inge.write(`${tote}, of these damaged`, '11');
  await inge.press('Send count');
  await inge.sees('More damaged than counted.');
  expect(await countsOf(theatre, shipment)).toBe(0);
});

journey(
  'a shipment of another company, its address guessed, is nothing at all',
  async ({ at, stage, scene }) => {
    const shipment = await sent(stage, {
      contents: 'empties',
      from: scene.sites.tarnby.id,
      to: scene.sites.orrin.id,
      load: { 'TOTE-64': 60 },
    });
    const inge = await at('phone', scene.people.inge);
    for (const address of [`/shipments/${shipment.id}`, `/shipments/${shipment.id}/count`]) {
      await inge.open(address);
      await inge.sees('There is nothing here under this address, or it is not yours to see.');
      expect(await inge.page.getByText('Orrin').count()).toBe(0);
    }
    await inge.isInOrder();
  },
);

journey('a shipment that the clerk sent is not the clerk’s to count', async ({ at, stage, scene }) => {
  const shipment = await sent(stage, {
    contents: 'fulls',
    from: scene.sites.kestrel.id,
    to: scene.sites.tarnby.id,
    load: { 'TOTE-64': 40 },
  });
  const inge = await at('phone', scene.people.inge);
  await inge.open(`/shipments/${shipment.id}/count`);
  await inge.sees('Only the receiver counts a shipment.');
});

journey(
  'a file that is not what its name says, and one too large, are refused by name; the count goes on',
  async (theatre) => {
    const { inge, shipment } = await openedCount(theatre);
    await inge.write(`${tote}, counted`, '398');
    const photos = inge.field('+ photo: Photos');
    await photos.setInputFiles(aLargeFile(11, aPhoto('wide.png')));
    await inge.sees('wide.png is larger than 10 MB, so it was not added.');
    await photos.setInputFiles(aPretender('gate.png', 'image/png'));
    await inge.sees(/The file is not what its name says/);
    await inge.isInOrder();
    await inge.press('Remove gate.png');
    await photos.setInputFiles(aPaper());
    await inge.one('link', /delivery-note\.pdf/).waitFor();
    await inge.press('Send count');
    await inge.sees(`Your count of ${shipment.reference} is in the book.`);
  },
);

journey(
  'the session ends in the middle of a count: signing in over the page goes on with what was typed',
  async (theatre) => {
    const { inge, shipment } = await openedCount(theatre);
    await inge.write(`${tote}, counted`, '391');
    await asOwner(theatre.stage.database.name, (owner) => owner.query('DELETE FROM sessions'));
    await inge.press('Send count');
    await inge.sees('Your sign-in has ended.');
    await inge.isInOrder();
    await inge.write('Password', testPassword);
    await inge.press('Sign in');
    await inge.sees(`Your count of ${shipment.reference} is in the book.`);
    await inge.sees('9 fewer than declared');
    expect(await countsOf(theatre, shipment)).toBe(1);
  },
);

journey(
  'the server is down while a count is sent: it says so, keeps it, and sends it once',
  async (theatre) => {
    const { inge, shipment } = await openedCount(theatre);
    await inge.write(`${tote}, counted`, '396');
    await theatre.stage.stopServer();
    await inge.press('Send count');
    await inge.sees('Not sent: no connection. Everything you typed is kept here.');
    expect(await inge.field(`${tote}, counted`).inputValue()).toBe('396');
    inge.forgive(/ERR_CONNECTION_REFUSED/);
    await theatre.stage.startServer();
    await inge.press('Send again');
    await inge.sees(`Your count of ${shipment.reference} is in the book.`);
    expect(await countsOf(theatre, shipment)).toBe(1);
  },
);

journey('a count half typed survives closing the page', async (theatre) => {
  const { inge } = await openedCount(theatre);
  await inge.write(`${tote}, counted`, '387');
  inge.page.once('dialog', (dialog) => void dialog.accept());
  await inge.page.reload();
  await inge.sees('What you typed earlier is still here.');
  expect(await inge.field(`${tote}, counted`).inputValue()).toBe('387');
});

journey('a delivery counted by file in the meantime is not counted twice', async (theatre) => {
  const { inge, shipment } = await openedCount(theatre);
  await counted(theatre.stage, { shipment, load: { 'TOTE-64': 400 } });
  await inge.write(`${tote}, counted`, '400');
  await inge.press('Send count');
  await inge.sees(/has counted this already/);
  expect(await countsOf(theatre, shipment)).toBe(1);
});
