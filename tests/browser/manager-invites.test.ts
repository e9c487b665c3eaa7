import { theatre } from './support/journey';

const { journey } = theatre('manager_invites');

journey(
  'a partner’s manager invites a colleague, sees only the own people, and not the log or the mail',
  async ({ at, scene }) => {
    const rasmus = await at('phone', scene.people.rasmus);
    await rasmus.open('/more');
    await rasmus.arrives('More');
    await rasmus.isInOrder();
    await rasmus.follow('People');
    await rasmus.arrives('People');
    await rasmus.sees('Inge Madsen');
    expect(await rasmus.page.getByText('Olaf Orrin').count()).toBe(0);
    expect(await rasmus.page.getByText('Ane Ravn').count()).toBe(0);
    await rasmus.follow('Invite someone');
    await rasmus.write('Name', 'Karla Spole');
    await rasmus.write('Mail', scene.people.inge.email);
    await rasmus.field('Clerk').check();
    await rasmus.press('Send the invitation');
    await rasmus.sees('This address cannot be used for a new sign-in');
    await rasmus.write('Mail', 'karla@kestrel.example');
    await rasmus.isInOrder();
    await rasmus.press('Send the invitation');
    await rasmus.arrives('People');
    await rasmus.sees('Karla Spole');
    await rasmus.sees('invited, not in yet');
    for (const place of ['/log', '/mail', '/partners']) {
      await rasmus.open(place);
      await rasmus.sees('Your role does not allow this. Nothing was changed.');
    }
  },
);
