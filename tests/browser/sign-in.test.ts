import { testPassword } from '../support/builders';
import { bothDevices, theatre } from './support/journey';

const { journey } = theatre('sign_in');

for (const device of bothDevices) {
  journey(`a clerk signs in at the ${device}, lands on Today and signs out`, async ({ at, scene }) => {
    const inge = await at(device);
    await inge.open('/shipments');
    await inge.arrives('Sign in');
    await inge.isInOrder();
    await inge.write('E-mail', scene.people.inge.email);
    await inge.write('Password', 'not this one');
    await inge.press('Sign in');
    await inge.sees('E-mail and password do not fit together');
    await inge.write('Password', testPassword);
    await inge.press('Sign in');
    await inge.arrives('Shipments');
    await inge.open('/account');
    await inge.sees('Inge Madsen');
    await inge.isInOrder();
    await inge.press('Sign out');
    await inge.arrives('Sign in');
    await inge.open('/account');
    await inge.arrives('Sign in');
  });
}
