import { balances } from './en/balances';
import { containerTypes } from './en/container-types';
import { differences } from './en/differences';
import { disputes } from './en/disputes';
import { fields } from './en/fields';
import { imports } from './en/imports';
import { gallery } from './en/gallery';
import { letters, log } from './en/log';
import { months } from './en/months';
import { parts } from './en/parts';
import { partners } from './en/partners';
import { people } from './en/people';
import { pool } from './en/pool';
import { problems } from './en/problems';
import { session } from './en/session';
import { shell } from './en/shell';
import { shipments } from './en/shipments';
import { statements } from './en/statements';
import { terms } from './en/terms';
import { today } from './en/today';
import { ui } from './en/ui';

/** Every text shown to people, by area. Another language is another set of the same shape. */
export const text = {
  balances,
  containerTypes,
  differences,
  disputes,
  fields,
  imports,
  gallery,
  letters,
  log,
  months,
  parts,
  partners,
  people,
  pool,
  problems,
  session,
  shell,
  shipments,
  statements,
  terms,
  today,
  ui,
} as const;
