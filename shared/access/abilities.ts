/**
 * Who may do what: one table. A person has one company and one or more roles; what its roles may do is the union.
 * Scope (whose records) is not here: partner roles see their own company's records, operator roles all.
 */
export const operatorRoles = ['coordinator', 'engineer', 'finance', 'administrator', 'auditor'] as const;
export const partnerRoles = ['clerk', 'manager'] as const;
export const roles = [...operatorRoles, ...partnerRoles] as const;
export type Role = (typeof roles)[number];
export type CompanyKind = 'operator' | 'partner';

const table = {
  'see own account': ['coordinator', 'engineer', 'finance', 'administrator', 'auditor', 'clerk', 'manager'],
  'see shipments': ['coordinator', 'engineer', 'finance', 'administrator', 'auditor', 'clerk', 'manager'],
  'send shipments': ['coordinator', 'clerk'],
  'count shipments': ['coordinator', 'clerk'],
  'send files': ['coordinator', 'finance', 'clerk', 'manager'],
  'see balances': ['coordinator', 'engineer', 'finance', 'administrator', 'auditor', 'clerk', 'manager'],
  'adjust stock': ['coordinator'],
  'see differences': ['coordinator', 'finance', 'auditor'],
  'settle differences': ['coordinator'],
  'import movements': ['coordinator'],
  'see disputes': ['coordinator', 'finance', 'auditor', 'clerk', 'manager'],
  'open disputes': ['clerk', 'manager'],
  'answer disputes': ['coordinator', 'finance'],
  'see statements': ['finance', 'auditor', 'coordinator', 'clerk', 'manager'],
  'answer statements': ['manager'],
  'see terms': ['finance', 'auditor', 'coordinator', 'manager'],
  'set terms': ['finance'],
  'see months': ['finance', 'auditor', 'coordinator'],
  'close months': ['finance'],
  'see container types': [
    'coordinator',
    'engineer',
    'finance',
    'administrator',
    'auditor',
    'clerk',
    'manager',
  ],
  'keep container types': ['engineer'],
  'see pool': ['engineer', 'coordinator', 'finance', 'auditor'],
  'plan pool': ['engineer'],
  'approve pool': ['engineer'],
  'see partners': ['coordinator', 'engineer', 'finance', 'administrator', 'auditor'],
  'keep partners': ['administrator'],
  'see people': ['administrator', 'auditor', 'manager'],
  'keep people': ['administrator'],
  'invite people': ['administrator', 'manager'],
  'read log': ['administrator', 'auditor'],
  'read captured mail': ['administrator'],
} as const satisfies Record<string, readonly Role[]>;

export type Ability = keyof typeof table;
export const abilities = Object.keys(table) as Ability[];

export function abilitiesOf(held: readonly Role[]): Ability[] {
  return abilities.filter((ability) => mayWith(held, ability));
}

export function mayWith(held: readonly Role[], ability: Ability): boolean {
  const allowed: readonly Role[] = table[ability];
  return held.some((role) => allowed.includes(role));
}

/** Roles that a person of this kind of company can be given. */
export function rolesFor(kind: CompanyKind): readonly Role[] {
  return kind === 'operator' ? operatorRoles : partnerRoles;
}
