import { bothDevices, theatre } from './support/journey';

const { journey } = theatre('administrator_invites');

for (const device of bothDevices) {
  journey(
    `at the ${device} an administrator adds a partner and invites its clerk, who chooses a password and signs in`,
    async ({ at, scene }) => {
      const name = `Bramble & Ott ${device}`;
      const email = `tilde.${device}@bramble.example`;
      const jonas = await at(device, scene.people.jonas);
      await jonas.open('/partners');
      await jonas.sees('Kestrel Coil Works');
      await jonas.isInOrder();
      await jonas.follow('Add a partner');
      await jonas.arrives('Add a partner');
      await jonas.press('Add a partner');
      await jonas.sees(/things need another look/);
      await jonas.isInOrder();
      await jonas.write('Name', name);
      await jonas.write('Code', `BRAMBLE-${device === 'desk' ? 1 : 2}`);
      await jonas.write('First site: name', 'Bramby, hall 3');
      await jonas.write('First site: code', `BRAMBY-${device === 'desk' ? 1 : 2}`);
      await jonas.press('Add a partner');
      await jonas.arrives(name);
      await jonas.isInOrder();

      await jonas.open('/people');
      await jonas.sees('Inge Madsen');
      await jonas.isInOrder();
      await jonas.follow('Invite someone');
      await jonas.write('Name', 'Tilde Ott');
      await jonas.write('Mail', email);
      await jonas.pick('Company', name);
      await jonas.field('Clerk').check();
      await jonas.isInOrder();
      await jonas.press('Send the invitation');
      await jonas.arrives('People');

      await jonas.open(`/mail?search=${encodeURIComponent(email)}`);
      await jonas.sees(/captured/);
      await jonas.isInOrder();
      await jonas.follow(/Your sign-in for/);
      await jonas.sees(/Choose your password here within 14 days/);
      await jonas.isInOrder();
      const link = await jonas.page.getByText(/choose-password/).innerText();

      const tilde = await at(device);
      const { pathname, search } = new URL(link.trim());
      await tilde.open(pathname + search);
      await tilde.arrives('Choose a password');
      await tilde.isInOrder();
      await tilde.write('New password', 'short');
      await tilde.press('Keep this password');
      await tilde.sees('At least 8 characters');
      await tilde.write('New password', 'housings by the dozen');
      await tilde.press('Keep this password');
      await tilde.sees('The password is kept.');
      await tilde.follow('Go to sign in');
      await tilde.write('E-mail', email);
      await tilde.write('Password', 'housings by the dozen');
      await tilde.press('Sign in');
      await tilde.arrives('Today');

      await tilde.open(pathname + search);
      await tilde.write('New password', 'a second time around');
      await tilde.press('Keep this password');
      await tilde.sees('This link has been used or is too old.');

      await jonas.open('/log');
      await jonas.sees('Tilde Ott');
      await jonas.isInOrder();
    },
  );
}
