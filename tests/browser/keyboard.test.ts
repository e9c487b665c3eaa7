import { testPassword } from '../support/builders';
import { emptiesToKestrel } from './support/movements';
import { theatre } from './support/journey';
import type { Visit } from './support/visit';

const { journey } = theatre('keyboard');
const mostSteps = 60;

/** Tabs on until what has the focus bears this name; the focus must be seen wherever it stops. */
async function tabTo({ page }: Visit, name: RegExp): Promise<void> {
  for (let step = 0; step < mostSteps; step += 1) {
    await page.keyboard.press('Tab');
    const focused = page.locator(':focus');
    if ((await focused.count()) === 0) continue;
    const { label, outline } = await focused.evaluate((element) => {
      const input = element as HTMLInputElement;
      const named =
        element.getAttribute('aria-label') ?? input.labels?.[0]?.textContent ?? element.textContent;
      const style = getComputedStyle(element);
      const ringed = style.outlineStyle !== 'none' && parseFloat(style.outlineWidth) >= 2;
      return { label: (named ?? '').trim(), outline: ringed };
    });
    if (!outline) throw new Error(`"${label}" has the focus and does not show it`);
    if (name.test(label)) return;
  }
  throw new Error(`after ${mostSteps} steps nothing named ${name} had the focus`);
}

journey('a clerk signs in and counts a delivery without touching a mouse', async ({ at, stage, scene }) => {
  const { reference } = await emptiesToKestrel({ stage, scene }, { 'TOTE-64': 400, 'LID-128': 20 });
  const inge = await at('desk');
  const { keyboard } = inge.page;
  await inge.open('/');
  await inge.arrives('Sign in');
  await tabTo(inge, /^E-mail/);
  await keyboard.type(scene.people.inge.email);
  await tabTo(inge, /^Password/);
  await keyboard.type(testPassword);
  await keyboard.press('Enter');
  await inge.arrives('Today');
  await tabTo(inge, new RegExp(`^Count ${reference}`));
  await keyboard.press('Enter');
  await inge.arrives(`Count ${reference}`);
  await inge.sees('2 of 2 lines left');
  await tabTo(inge, /^As declared: Tote/);
  await keyboard.press('Enter');
  await inge.sees('1 of 2 lines left');
  await tabTo(inge, /^Other number, or damaged: Lid/);
  await keyboard.press('Space');
  await tabTo(inge, /^Lid 1200×800, counted/);
  await keyboard.type('19');
  await inge.sees('1 fewer than declared');
  await tabTo(inge, /^Send count/);
  await keyboard.press('Enter');
  await inge.sees(`Your count of ${reference} is in the book.`);
});

journey('the first step of the keyboard leads past the places to the content', async ({ at, scene }) => {
  const ane = await at('desk', scene.people.ane);
  await ane.open('/shipments');
  await ane.arrives('Shipments');
  await tabTo(ane, /^Go to the content/);
  await ane.page.keyboard.press('Enter');
  await tabTo(ane, /^Send empties/);
});
