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
