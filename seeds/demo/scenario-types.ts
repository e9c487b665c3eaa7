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
