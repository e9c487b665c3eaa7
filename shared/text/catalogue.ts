import { fields } from './en/fields';
import { imports } from './en/imports';
import { gallery } from './en/gallery';
import { letters, log } from './en/log';
import { partners } from './en/partners';
import { people } from './en/people';
import { problems } from './en/problems';
import { session } from './en/session';
import { shell } from './en/shell';
import { shipments } from './en/shipments';
import { ui } from './en/ui';

/** Every text shown to people, by area. Another language is another set of the same shape. */
export const text = {
  fields,
  imports,
  gallery,
  letters,
  log,
  partners,
  people,
  problems,
  session,
  shell,
  shipments,
  ui,
} as const;
