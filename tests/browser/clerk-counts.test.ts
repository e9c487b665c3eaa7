import { emptiesToKestrel } from './support/movements';
import { bothDevices, theatre } from './support/journey';
import { aPhoto } from './support/papers';

const { journey } = theatre('clerk_counts');

for (const device of bothDevices) {
  journey(
    `a clerk at the ${device} counts as declared, another number, damaged ones and a photo`,
    async ({ at, stage, scene }) => {
      const shipment = await emptiesToKestrel({ stage, scene }, { 'TOTE-64': 400, 'LID-128': 20 });
      const inge = await at(device, scene.people.inge);
      await inge.open('/shipments');
      await inge.sees(shipment.reference);
      await inge.isInOrder();
      await inge.follow(new RegExp(shipment.reference));
      await inge.arrives(`Empties ${shipment.reference}`);
      await inge.isInOrder();
      await inge.follow('Count this delivery');
      await inge.arrives(`Count ${shipment.reference}`);
      await inge.sees('2 of 2 lines left');
      await inge.isInOrder();
      await inge.press('As declared: Lid 1200×800');
      await inge.press('Other number, or damaged: Tote 600×400×280');
      await inge.write('Tote 600×400×280, counted', '392');
      await inge.write('Tote 600×400×280, of these damaged', '3');
      await inge.sees('8 fewer than declared');
      await inge.field('+ photo: Photos').setInputFiles(aPhoto());
      await inge.one('link', /load\.png/).waitFor();
      await inge.isInOrder();
      await inge.press('Send count');
      await inge.sees(`Your count of ${shipment.reference} is in the book.`);
      await inge.sees('8 fewer than declared');
      await inge.isInOrder();
      await inge.follow(`Open ${shipment.reference}`);
      await inge.sees(/Counted by Inge Madsen/);
      await inge.sees('392');
      await inge.isInOrder();
    },
  );
}

journey(
  'two people count the same delivery: the second is told who and when, and nothing is posted',
  async ({ at, stage, scene }) => {
    const shipment = await emptiesToKestrel({ stage, scene }, { 'TOTE-64': 80 });
    const [first, second] = [await at('phone', scene.people.inge), await at('desk', scene.people.inge)];
    for (const each of [first, second]) {
      await each.open(`/shipments/${shipment.id}/count`);
      await each.press('As declared: Tote 600×400×280');
    }
    await first.press('Send count');
    await first.sees('Everything came as declared.');
    await second.press('Send count');
    await second.sees(/Inge Madsen has counted this already/);
  },
);
