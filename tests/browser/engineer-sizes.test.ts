import { bothDevices, theatre } from './support/journey';

const { journey } = theatre('engineer_sizes');

for (const device of bothDevices) {
  // 400 parts a day, 4 in a container, five legs of 2 days and a buffer of 1: 100 × (10 + 1), RULES 7.
  journey(
    `at the ${device} an engineer states a part and its loop, sees the size and why, and approves it`,
    async ({ at, scene }) => {
      const type = device === 'phone' ? scene.types.tote : scene.types.lid;
      const sif = await at(device, scene.people.sif);
      await sif.open('/container-types');
      await sif.arrives('Container types');
      await sif.isInOrder();
      await sif.open('/parts/new');
      await sif.write('Part number', `COIL-${device}`);
      await sif.write('Name', 'Coil of three rows');
      await sif.pick('Travels in', type.name);
      await sif.pick('From the supplier’s site', 'Kestrel Coil Works, Kestrel, dock 2');
      await sif.pick('To the plant', 'Fennmark Heat Pumps, Tarnby Assembly');
      await sif.write('Parts in a container', '4');
      await sif.write(/^Parts a working day/, '400');
      await sif.write(/^Standard deviation/, '0');
      await sif.isInOrder();
      await sif.press('Add a part');
      await sif.arrives('Parts and loops');
      await sif.isInOrder();

      await sif.open(`/parts/loops/${type.code}`);
      await sif.arrives(`The loop of ${type.name}`);
      const days = sif.page.getByLabel('Days', { exact: true });
      await days.first().waitFor();
      for (let leg = 0; leg < 5; leg += 1) await days.nth(leg).fill('2');
      await sif.isInOrder();
      await sif.press('Save the loop');
      await sif.one('link', /^Approve 1\s100$/).waitFor();
      await sif.isInOrder();

      await sif.write('Buffer, days', '2');
      await sif.sees('These figures follow what you typed; it is not saved yet.');
      await sif.sees(/1\s200/);
      await sif.press('Save these assumptions');
      await sif.follow(/^Approve 1\s200$/);
      await sif.arrives('Approve a pool size');
      await sif.write(/^Note/, 'Two days of buffer until the new line runs.');
      await sif.press('Add a level for Fennmark Heat Pumps, Tarnby Assembly');
      await sif.write('Minimum', '300');
      await sif.write('Maximum', '600');
      await sif.isInOrder();
      await sif.press('Approve');
      await sif.sees(/approved 1\s200/);
      await sif.sees('Two days of buffer until the new line runs.');
      await sif.isInOrder();
    },
  );
}
