type SceneApproval = {
  typeCode: string;
  /** The approved size in thousandths of the reckoned one. */
  perMille: number;
  note: string;
  daysBefore: number;
  levels: readonly (readonly [site: string, minimum: number, maximum: number])[];
};

/** Invented: sizes and levels that the engineer approved, oldest first. */
export const approvals: readonly SceneApproval[] = [
  {
    typeCode: 'TOTE-64',
    perMille: 960,
    note: 'Until the second wash line runs.',
    daysBefore: 110,
    levels: [['KESTREL', 600, 1400]],
  },
  {
    typeCode: 'TOTE-43',
    perMille: 1000,
    note: '',
    daysBefore: 62,
    levels: [
      ['TARNBY', 1400, 2600],
      ['OSTREL', 400, 1000],
      ['PALLWICK', 320, 900],
      ['MAREN', 120, 400],
    ],
  },
  {
    typeCode: 'RACK-CP',
    perMille: 1120,
    note: 'The new compressor family takes two racks in ten from the spring on.',
    daysBefore: 41,
    levels: [
      ['OSTREL', 120, 260],
      ['SUNDHOLM', 24, 96],
    ],
  },
  {
    typeCode: 'TOTE-64',
    perMille: 985,
    note: 'A little below what is reckoned: Orrin gives back what it has too many of.',
    daysBefore: 20,
    levels: [
      ['TARNBY', 1600, 3200],
      ['OSTREL', 500, 1200],
      ['KESTREL', 600, 1400],
      ['ORRIN', 150, 500],
      ['VALE', 150, 400],
    ],
  },
];
