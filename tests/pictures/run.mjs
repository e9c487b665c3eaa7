import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { end, runUntilEnded } from '../../server/launch/lifetime.mjs';
import { root } from '../../server/launch/project.mjs';
import { say, step } from '../../server/launch/say.mjs';
import { chromiumProgram } from '../run/chromium.mjs';
import { openCamera } from './camera.mjs';
import { provideDemo } from './demo.mjs';
import { takeReadmePictures } from './readme.mjs';
import { screensByPerson } from './screens.mjs';

/** Four pictures for the README; with --all also every screen in both themes, for whoever looks them over. */
runUntilEnded(async () => {
  process.chdir(root);
  const url = await provideDemo(root);
  const camera = await openCamera(url, chromiumProgram(say));
  const people = JSON.parse(readFileSync(join(root, 'seeds/demo/sign-ins.json'), 'utf8'));
  const as = (/** @type {string} */ email) =>
    camera.as(people.find((/** @type {{ email: string }} */ person) => person.email === email));
  await step('Pictures of the README', () => takeReadmePictures(root, { as }));
  if (process.argv.includes('--all')) await step('Every screen', () => takeAll(as));
  await end(0);
}, 130);

/** @param {(email: string) => Promise<import('./camera.mjs').Camera>} as */
async function takeAll(as) {
  const folder = join(root, '.local/pictures');
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  for (const [email, screens] of Object.entries(screensByPerson)) {
    const person = await as(email);
    for (const path of await screens(person)) {
      for (const width of [390, 1440]) {
        for (const theme of /** @type {const} */ (['light', 'dark'])) {
          const picture = await person.shoot(path, { look: { width, height: 844, theme }, whole: true });
          writeFileSync(join(folder, nameOf({ email, path, width, theme })), picture);
        }
      }
    }
  }
}

/** @param {{ email: string, path: string, width: number, theme: string }} of */
function nameOf({ email, path, width, theme }) {
  const place = path === '/' ? 'today' : path.slice(1).replace(/[^a-z0-9]+/gi, '-');
  return `${email.split('@')[0]}-${place}-${width}-${theme}.png`;
}
