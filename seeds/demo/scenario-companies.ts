import type { Role } from '@/shared/access/abilities';

/** The invented scenario: one operator with two plants, eight partners, six container types. */
export type SceneCompany = {
  kind: 'operator' | 'partner';
  code: string;
  name: string;
  address: string;
  tolerancePct?: string;
  taxRate: string;
  taxTreatment: 'excluded' | 'included';
  sites: readonly { code: string; name: string }[];
  people: readonly { name: string; email: string; roles: readonly Role[] }[];
};

const partner = (
  code: string,
  name: string,
  rest: { address: string; people: SceneCompany['people']; taxTreatment?: 'included'; tolerancePct?: string },
): SceneCompany => ({
  kind: 'partner',
  code,
  name,
  address: rest.address,
  taxRate: '25',
  taxTreatment: rest.taxTreatment ?? 'excluded',
  tolerancePct: rest.tolerancePct ?? '0',
  sites: [{ code, name }],
  people: rest.people,
});

export const companies: readonly SceneCompany[] = [
  {
    kind: 'operator',
    code: 'FENNMARK',
    name: 'Fennmark Heat Pumps',
    address: 'Fennvej 1, Tarnby Strand',
    taxRate: '25',
    taxTreatment: 'excluded',
    sites: [
      { code: 'TARNBY', name: 'Tarnby Assembly' },
      { code: 'OSTREL', name: 'Ostrel Compressor Hall' },
    ],
    people: [
      { name: 'Ane Ravn', email: 'ane@fennmark.example', roles: ['coordinator'] },
      { name: 'Sif Holm', email: 'sif@fennmark.example', roles: ['engineer'] },
      { name: 'Mikkel Thorn', email: 'mikkel@fennmark.example', roles: ['finance'] },
      { name: 'Jonas Lykke', email: 'jonas@fennmark.example', roles: ['administrator'] },
      { name: 'Ida Vest', email: 'ida@fennmark.example', roles: ['auditor'] },
    ],
  },
  partner('KESTREL', 'Kestrel Coil Works', {
    address: 'Spolegade 8, Kestrup',
    people: [
      { name: 'Inge Madsen', email: 'inge@kestrel.example', roles: ['clerk'] },
      { name: 'Rasmus Toft', email: 'rasmus@kestrel.example', roles: ['manager'] },
    ],
  }),
  partner('BRAMBLE', 'Bramble & Ott Plastics', {
    address: 'Mill Lane 3, Bramby',
    people: [{ name: 'Tilde Ott', email: 'tilde@bramble.example', roles: ['clerk', 'manager'] }],
  }),
  partner('SUNDHOLM', 'Sundholm Compressors', {
    address: 'Havnen 40, Sundholm',
    taxTreatment: 'included',
    people: [{ name: 'Per Sund', email: 'per@sundholm.example', roles: ['clerk', 'manager'] }],
  }),
  partner('PALLWICK', 'Pallwick Fasteners', {
    address: 'Bolt Street 19, Pallwick',
    tolerancePct: '0.5',
    people: [{ name: 'Greta Wick', email: 'greta@pallwick.example', roles: ['clerk', 'manager'] }],
  }),
  partner('ORRIN', 'Orrin Sheet Metal', {
    address: 'Pressvej 5, Orrin',
    people: [{ name: 'Olaf Orrin', email: 'olaf@orrin.example', roles: ['clerk', 'manager'] }],
  }),
  partner('MAREN', 'Maren Electronics', {
    address: 'Kredsen 12, Maren',
    people: [{ name: 'Nanna Krog', email: 'nanna@maren.example', roles: ['clerk', 'manager'] }],
  }),
  partner('VALE', 'Vale Crossdock', {
    address: 'Ring Road 77, Vale',
    people: [{ name: 'Bo Vale', email: 'bo@vale.example', roles: ['clerk', 'manager'] }],
  }),
  partner('BRIGHTWASH', 'Brightwash', {
    address: 'Vandvej 2, Lysby',
    people: [{ name: 'Liv Bright', email: 'liv@brightwash.example', roles: ['clerk', 'manager'] }],
  }),
];
