import type { Ability, Role } from '@/shared/access/abilities';
import { text } from '@/shared/text/catalogue';
import type { Tone } from '../theme/meaning';

type PlaceKey = keyof typeof text.shell.place;
export type Place = {
  key: PlaceKey;
  label: string;
  href: string;
  /** Colour of the number beside it. */
  tone?: Tone;
};

const places: Partial<Record<PlaceKey, { href: string; needs?: Ability; tone?: Tone }>> = {
  today: { href: '/' },
  shipments: { href: '/shipments', needs: 'see shipments' },
  balances: { href: '/balances', needs: 'see balances' },
  differences: { href: '/differences', needs: 'see differences', tone: 'differs' },
  disputes: { href: '/disputes', needs: 'see disputes', tone: 'disputed' },
  imports: { href: '/imports', needs: 'import movements' },
  pool: { href: '/pool', needs: 'see pool' },
  statements: { href: '/statements', needs: 'see statements' },
  partners: { href: '/partners', needs: 'see partners' },
  containerTypes: { href: '/container-types', needs: 'see container types' },
  parts: { href: '/parts', needs: 'see pool' },
  terms: { href: '/terms', needs: 'see terms' },
  months: { href: '/months', needs: 'see months' },
  people: { href: '/people', needs: 'see people' },
  mail: { href: '/mail', needs: 'read captured mail' },
  gallery: { href: '/gallery', needs: 'keep partners' },
  log: { href: '/log', needs: 'read log' },
};

/** Each role's places, most used first (LOOK.md). */
const byRole: Record<Role, readonly PlaceKey[]> = {
  clerk: ['today', 'shipments', 'balances', 'statements', 'disputes', 'containerTypes'],
  manager: ['today', 'statements', 'disputes', 'balances', 'shipments', 'terms', 'people', 'containerTypes'],
  coordinator: [
    'today',
    'shipments',
    'balances',
    'differences',
    'disputes',
    'imports',
    'pool',
    'statements',
    'partners',
    'containerTypes',
  ],
  engineer: ['today', 'containerTypes', 'pool', 'parts', 'balances', 'shipments', 'partners'],
  finance: ['today', 'statements', 'disputes', 'terms', 'months', 'partners', 'balances', 'differences'],
  administrator: [
    'today',
    'people',
    'partners',
    'containerTypes',
    'shipments',
    'balances',
    'mail',
    'gallery',
  ],
  auditor: [
    'today',
    'shipments',
    'balances',
    'differences',
    'disputes',
    'statements',
    'terms',
    'months',
    'pool',
    'parts',
    'partners',
    'people',
    'containerTypes',
  ],
};

export type Who = {
  roles: readonly Role[];
  kind: 'operator' | 'partner';
  may: (ability: Ability) => boolean;
};

function placeOf(key: PlaceKey, kind: Who['kind']): Place | undefined {
  const place = places[key];
  if (place === undefined) return undefined;
  const ownBalance = key === 'balances' && kind === 'partner';
  const label = ownBalance ? text.shell.place.balance : text.shell.place[key];
  return { key, label, href: place.href, ...(place.tone ? { tone: place.tone } : {}) };
}

/** The places of a person: those of all roles held, in the order of the first, without what may not be seen. */
export function placesOf({ roles, kind, may }: Who): Place[] {
  const keys = [...new Set(roles.flatMap((role) => byRole[role]))];
  return keys
    .filter((key) => {
      const needs = places[key]?.needs;
      return needs === undefined || may(needs);
    })
    .flatMap((key) => placeOf(key, kind) ?? []);
}

/** At the foot of the rail, or under More. */
export function footPlacesOf({ may, kind }: Who): Place[] {
  const log = may('read log') ? placeOf('log', kind) : undefined;
  return log === undefined ? [] : [log];
}

export function isAt(href: string, path: string): boolean {
  return href === '/' ? path === '/' : path === href || path.startsWith(`${href}/`);
}
