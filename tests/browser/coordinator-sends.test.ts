import { bothDevices, theatre } from './support/journey';

const { journey } = theatre('coordinator_sends');

for (const device of bothDevices) {
  journey(
    `at the ${device} a coordinator sends empties, sees what the clerk counted, settles it and opens the balance`,
    async ({ at, scene }) => {
      const reference = `EM-${device}-1`;
      const ane = await at(device, scene.people.ane);
      await ane.open('/');
      await ane.arrives('Where the pool is');
      await ane.isInOrder();
      await ane.follow('Send empties');
      await ane.arrives('Send empties');
      await ane.isInOrder();
      await ane.pick('From', 'Fennmark Heat Pumps: Tarnby Assembly');
      await ane.pick('To', 'Kestrel Coil Works: Kestrel, dock 2');
      await ane.pick('Container type', 'Tote 600×400×280');
      await ane.write('Units', '400');
      await ane.sees(/at this site by the book/);
      await ane.write(/^Number of your note/, reference);
      await ane.press('Send empties');
      await ane.sees('Sent. Kestrel Coil Works sees it now.');
      await ane.isInOrder();
      await ane.follow(`Open ${reference}`);
      await ane.arrives(`Empties ${reference}`);
      await ane.sees('on the way');

      const inge = await at('phone', scene.people.inge);
      await inge.open('/');
      await inge.arrives('Today');
      await inge.sees(reference);
      await inge.isInOrder();
      await inge.follow(`Count ${reference}`);
      await inge.press('Other number, or damaged: Tote 600×400×280');
      await inge.write('Tote 600×400×280, counted', '392');
      await inge.press('Send count');
      await inge.sees(`Your count of ${reference} is in the book.`);

      await ane.open('/differences');
      await ane.arrives('Differences');
      await ane.sees(reference);
      await ane.isInOrder();
      await ane.follow(new RegExp(reference));
      await ane.sees('8 fewer than declared');
      await ane.isInOrder();
      await ane.field('The sender miscounted').check();
      await ane.write('How do you know?', 'Eight totes still stood at gate 4.');
      await ane.sees(/8 units go back to Fennmark Heat Pumps in the book/);
      await ane.isInOrder();
      await ane.press('Settle');
      await ane.sees(/8 units settled as the sender’s miscount/);

      await ane.open('/balances');
      await ane.arrives('Balances');
      await ane.sees('Kestrel Coil Works');
      await ane.isInOrder();
      await ane.open(`/balances/${scene.companies.kestrel.id}/TOTE-64`);
      await ane.arrives('Tote 600×400×280');
      await ane.sees(reference);
      await ane.isInOrder();
    },
  );
}
