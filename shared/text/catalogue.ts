import { fields } from './en/fields';
import { problems } from './en/problems';
import { session } from './en/session';
import { shell } from './en/shell';
import { ui } from './en/ui';

/** Every text shown to people, by area. Another language is another set of the same shape. */
export const text = {
  fields,
  problems,
  session,
  shell,
  ui,
} as const;
