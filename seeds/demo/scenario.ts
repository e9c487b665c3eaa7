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

type SceneType = {
  code: string;
  name: string;
  kind: 'tote' | 'lid' | 'pallet' | 'box' | 'rack';
  size: readonly [number, number, number];
  tareKg: string;
  payloadKg: string;
  stackLimit: number;
  unitsPerStack: number;
  replacement: string;
  usefulLifeMonths: number;
  note: string;
  /** Deposit, daily fee, free days, lost after days, damage fee, cleaning fee, as most partners have them. */
  terms: {
    deposit: string;
    dailyFee: string;
    freeDays: number;
    lostAfterDays: number | null;
    damageFee: string;
    cleaningFee: string;
  };
};

export const containerTypes: readonly SceneType[] = [
  {
    code: 'TOTE-64',
    name: 'Tote 600×400×280',
    kind: 'tote',
    size: [600, 400, 280],
    tareKg: '2.1',
    payloadKg: '25',
    stackLimit: 8,
    unitsPerStack: 8,
    replacement: '18.00',
    usefulLifeMonths: 60,
    note: 'Straight walls, stacks on a pallet four to a layer.',
    terms: {
      deposit: '4.50',
      dailyFee: '0.03',
      freeDays: 14,
      lostAfterDays: null,
      damageFee: '3.20',
      cleaningFee: '0.40',
    },
  },
  {
    code: 'TOTE-43',
    name: 'Tote 400×300×280',
    kind: 'tote',
    size: [400, 300, 280],
    tareKg: '1.3',
    payloadKg: '15',
    stackLimit: 8,
    unitsPerStack: 8,
    replacement: '11.50',
    usefulLifeMonths: 60,
    note: 'Also with foam lining for controllers.',
    terms: {
      deposit: '3.00',
      dailyFee: '0.02',
      freeDays: 14,
      lostAfterDays: null,
      damageFee: '2.10',
      cleaningFee: '0.30',
    },
  },
  {
    code: 'LID-128',
    name: 'Lid 1200×800',
    kind: 'lid',
    size: [1200, 800, 60],
    tareKg: '4.2',
    payloadKg: '0',
    stackLimit: 30,
    unitsPerStack: 20,
    replacement: '34.00',
    usefulLifeMonths: 72,
    note: 'Covers one pallet load.',
    terms: {
      deposit: '12.00',
      dailyFee: '0.05',
      freeDays: 21,
      lostAfterDays: null,
      damageFee: '6.00',
      cleaningFee: '0.60',
    },
  },
  {
    code: 'PALLET-128',
    name: 'Plastic pallet 1200×800',
    kind: 'pallet',
    size: [1200, 800, 150],
    tareKg: '15.5',
    payloadKg: '1000',
    stackLimit: 20,
    unitsPerStack: 20,
    replacement: '62.00',
    usefulLifeMonths: 84,
    note: 'Three runners.',
    terms: {
      deposit: '20.00',
      dailyFee: '0.08',
      freeDays: 21,
      lostAfterDays: null,
      damageFee: '9.50',
      cleaningFee: '0.90',
    },
  },
  {
    code: 'BOX-1210',
    name: 'Folding box 1200×1000×975',
    kind: 'box',
    size: [1200, 1000, 975],
    tareKg: '58',
    payloadKg: '500',
    stackLimit: 3,
    unitsPerStack: 3,
    replacement: '195.00',
    usefulLifeMonths: 96,
    note: 'Folds to 390 mm for the way back.',
    terms: {
      deposit: '55.00',
      dailyFee: '0.25',
      freeDays: 14,
      lostAfterDays: 120,
      damageFee: '24.00',
      cleaningFee: '3.50',
    },
  },
  {
    code: 'RACK-CP',
    name: 'Compressor rack',
    kind: 'rack',
    size: [1200, 1000, 1100],
    tareKg: '96',
    payloadKg: '640',
    stackLimit: 2,
    unitsPerStack: 2,
    replacement: '640.00',
    usefulLifeMonths: 120,
    note: 'Holds eight compressors; built for one family.',
    terms: {
      deposit: '160.00',
      dailyFee: '0.80',
      freeDays: 10,
      lostAfterDays: null,
      damageFee: '75.00',
      cleaningFee: '6.00',
    },
  },
];

type LaneLoad = { typeCode: string; units: number };
/** A standing exchange: empties out on some weekdays, fulls back on others. Weekday 1 is Monday. */
export type Lane = {
  plant: string;
  partner: string;
  out: readonly number[];
  back: readonly number[];
  load: readonly LaneLoad[];
  /** Of what it holds beyond a working stock, the share (per mille) that a partner sends back each time. */
  returnsPerMille: number;
};

export const lanes: readonly Lane[] = [
  {
    plant: 'TARNBY',
    partner: 'KESTREL',
    out: [1, 4],
    back: [2, 5],
    returnsPerMille: 980,
    load: [
      { typeCode: 'TOTE-64', units: 400 },
      { typeCode: 'LID-128', units: 20 },
      { typeCode: 'PALLET-128', units: 20 },
    ],
  },
  {
    plant: 'TARNBY',
    partner: 'BRAMBLE',
    out: [2],
    back: [4],
    returnsPerMille: 970,
    load: [{ typeCode: 'BOX-1210', units: 48 }],
  },
  {
    plant: 'OSTREL',
    partner: 'SUNDHOLM',
    out: [1, 3],
    back: [2, 4],
    returnsPerMille: 990,
    load: [{ typeCode: 'RACK-CP', units: 24 }],
  },
  {
    plant: 'TARNBY',
    partner: 'PALLWICK',
    out: [1, 3],
    back: [2, 5],
    returnsPerMille: 985,
    load: [
      { typeCode: 'TOTE-43', units: 320 },
      { typeCode: 'LID-128', units: 10 },
      { typeCode: 'PALLET-128', units: 10 },
    ],
  },
  {
    plant: 'TARNBY',
    partner: 'ORRIN',
    out: [2, 5],
    back: [4],
    returnsPerMille: 640,
    load: [
      { typeCode: 'BOX-1210', units: 30 },
      { typeCode: 'TOTE-64', units: 80 },
    ],
  },
  {
    plant: 'OSTREL',
    partner: 'MAREN',
    out: [3],
    back: [5],
    returnsPerMille: 975,
    load: [{ typeCode: 'TOTE-43', units: 160 }],
  },
  {
    plant: 'OSTREL',
    partner: 'VALE',
    out: [4],
    back: [1],
    returnsPerMille: 960,
    load: [
      { typeCode: 'TOTE-64', units: 160 },
      { typeCode: 'PALLET-128', units: 10 },
    ],
  },
  {
    plant: 'TARNBY',
    partner: 'BRIGHTWASH',
    out: [5],
    back: [3],
    returnsPerMille: 995,
    load: [{ typeCode: 'TOTE-64', units: 200 }],
  },
];

/** What stands at the plants when the book is opened. */
export const openingStock: readonly { site: string; typeCode: string; units: number }[] = [
  { site: 'TARNBY', typeCode: 'TOTE-64', units: 5200 },
  { site: 'OSTREL', typeCode: 'TOTE-64', units: 1400 },
  { site: 'TARNBY', typeCode: 'TOTE-43', units: 2600 },
  { site: 'OSTREL', typeCode: 'TOTE-43', units: 1100 },
  { site: 'TARNBY', typeCode: 'LID-128', units: 420 },
  { site: 'TARNBY', typeCode: 'PALLET-128', units: 460 },
  { site: 'OSTREL', typeCode: 'PALLET-128', units: 140 },
  { site: 'TARNBY', typeCode: 'BOX-1210', units: 640 },
  { site: 'OSTREL', typeCode: 'RACK-CP', units: 300 },
];

/** Packing specifications for the pool's demand. */
export const parts = [
  {
    number: 'HX-2210',
    name: 'heat exchanger coil',
    typeCode: 'TOTE-64',
    supplier: 'KESTREL',
    plant: 'TARNBY',
    unitsPerContainer: 12,
    mean: '1760',
    sd: '240',
  },
  {
    number: 'HS-0417',
    name: 'housing shell',
    typeCode: 'BOX-1210',
    supplier: 'BRAMBLE',
    plant: 'TARNBY',
    unitsPerContainer: 16,
    mean: '150',
    sd: '30',
  },
  {
    number: 'CP-0820',
    name: 'scroll compressor',
    typeCode: 'RACK-CP',
    supplier: 'SUNDHOLM',
    plant: 'OSTREL',
    unitsPerContainer: 8,
    mean: '72',
    sd: '11',
  },
  {
    number: 'FA-1100',
    name: 'fastener kit',
    typeCode: 'TOTE-43',
    supplier: 'PALLWICK',
    plant: 'TARNBY',
    unitsPerContainer: 200,
    mean: '24800',
    sd: '4100',
  },
  {
    number: 'PN-3306',
    name: 'side panel',
    typeCode: 'BOX-1210',
    supplier: 'ORRIN',
    plant: 'TARNBY',
    unitsPerContainer: 24,
    mean: '260',
    sd: '45',
  },
  {
    number: 'EC-5012',
    name: 'controller board',
    typeCode: 'TOTE-43',
    supplier: 'MAREN',
    plant: 'OSTREL',
    unitsPerContainer: 30,
    mean: '930',
    sd: '140',
  },
] as const;

/** The loop of each type with demand; days from the coordinator's own notes, invented. */
export const loops: Readonly<
  Record<
    string,
    {
      travel: 'independent' | 'together';
      bufferDays: string;
      legs: readonly (readonly [string, number, number])[];
    }
  >
> = {
  'TOTE-64': {
    travel: 'together',
    bufferDays: '2',
    legs: [
      ['filled at the supplier', 1.5, 0.5],
      ['on the way to the plant', 1, 0.3],
      ['full stock at the plant', 2, 1],
      ['at the line', 0.5, 0.1],
      ['empties at the plant', 2.5, 1.2],
      ['on the way back', 1, 0.3],
    ],
  },
  'TOTE-43': {
    travel: 'together',
    bufferDays: '2',
    legs: [
      ['filled at the supplier', 2, 0.7],
      ['on the way to the plant', 1, 0.3],
      ['full stock at the plant', 3, 1.2],
      ['at the line', 0.5, 0.2],
      ['empties at the plant', 2, 1],
      ['on the way back', 1, 0.3],
    ],
  },
  'BOX-1210': {
    travel: 'independent',
    bufferDays: '3',
    legs: [
      ['filled at the supplier', 2, 0.8],
      ['on the way to the plant', 1, 0.4],
      ['full stock at the plant', 2.5, 1],
      ['at the line', 1, 0.3],
      ['empties at the plant', 3, 1.5],
      ['on the way back', 1.5, 0.5],
    ],
  },
  'RACK-CP': {
    travel: 'together',
    bufferDays: '1',
    legs: [
      ['filled at the supplier', 1, 0.3],
      ['on the way to the plant', 0.5, 0.2],
      ['full stock at the plant', 1.5, 0.5],
      ['at the line', 0.5, 0.1],
      ['empties at the plant', 1.5, 0.8],
      ['on the way back', 0.5, 0.2],
    ],
  },
};
