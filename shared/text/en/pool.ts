import { formatDay, formatNumber, formatShare, formatUnits } from '../format';

/** A share that is not 0 never reads as 0, nor one that is not all as 100 %. */
function share(value: number): string {
  if (value > 0 && value < 0.0005) return 'under 0.1\u202f%';
  return value < 1 && value >= 0.9995 ? 'over 99.9\u202f%' : formatShare(value);
}

type Units = { units: number; many: string };

export const pool = {
  share,
  title: 'Pool',
  lead: 'How many of each type are there, how many are needed, and what is approved.',
  empty: {
    title: 'No container type stands here yet',
    hint: 'Add a container type, then state its parts and its loop: the pool size follows from them.',
    action: 'To the container types',
  },
  search: 'Name or code',
  columns: {
    type: 'Container type',
    inPool: 'In the pool today',
    needed: 'Needed',
    approved: 'Approved',
    standing: 'Stands',
    sites: 'Sites outside their levels',
  },
  typeCode: 'Code',
  sitesUnder: 'Sites under their minimum',
  sitesOver: 'Sites over their maximum',
  loopDays: 'Loop, days',
  perDay: 'Containers a day',
  short: (units: number) => `${formatUnits(units)} short`,
  above: (units: number) => `${formatUnits(units)} above`,
  asApproved: 'as approved',
  asNeeded: 'as needed',
  notPlanned: 'not planned',
  sites: (under: number, over: number) =>
    [under > 0 ? `${formatUnits(under)} under` : '', over > 0 ? `${formatUnits(over)} over` : '']
      .filter((words) => words !== '')
      .join(', '),

  question: (many: string) => `How many ${many} do we need?`,
  approvedTag: (size: number, day: string) => `approved ${formatUnits(size)}, ${formatDay(day, 'date')}`,
  approve: (size: number) => `Approve ${formatUnits(size)}`,
  save: 'Save these assumptions',
  undo: 'Undo',
  saved: 'Saved. The pool is reckoned anew.',
  unsaved: 'These figures follow what you typed; it is not saved yet.',
  whyNot: {
    'no parts': {
      title: 'No part travels in this type yet',
      hint: 'The pool size follows from the parts a day and the loop. Add the parts first.',
      action: 'Add a part',
    },
    'no loop': {
      title: 'The loop is not stated yet',
      hint: 'State the legs of the loop, and the size follows from them.',
      action: 'State the loop',
    },
    refused: {
      title: 'This cannot be reckoned',
      hint: 'The parts or the loop hold figures from which no size follows. Look them over.',
      action: 'Look at the loop',
    },
  },
  inPoolToday: ({ units, many }: Units) => `The book holds ${formatUnits(units)} ${many} today.`,

  loop: (days: number) => `The loop, ${formatNumber(days)} days`,
  loopCaption: 'Legs of the loop',
  leg: { name: 'Leg', days: 'Days', sd: '± sd', seen: 'Seen' },
  together: {
    'at the partner': 'at the partner, together',
    'to the plant': 'to the plant, together',
    'at the plant': 'at the plant, together',
    back: 'on the way back, together',
    elsewhere: 'elsewhere, together',
  },
  average: 'in the loop on average',
  changeLoop: 'Change the legs',
  longer: (where: string, { days, units, many }: Units & { days: number }) =>
    `${where}: ${formatNumber(days)} days longer than planned, ${formatUnits(units)} ${many}.`,
  where: {
    'at the partner': 'At the partner',
    'to the plant': 'On the way to the plant',
    'at the plant': 'At the plant',
    back: 'On the way back',
    elsewhere: 'Elsewhere',
  },

  assumed: (plan: { bufferDays: string; coverPct: string; travel: string }) =>
    `Buffer in days: ${plan.bufferDays}. Cover: ${plan.coverPct}\u202f%. They come back ${plan.travel}.`,
  buffer: 'Buffer, days',
  cover: 'Cover, %',
  comeBack: 'Come back',

  poolSize: 'pool size',
  inPool: 'in the pool today',
  toBuy: 'to buy',
  spare: 'to spare',
  replaced: 'replaced a year',
  trips: 'trips each a year',
  moreFigures: 'What it is made of',
  figure: {
    head: 'Figure',
    value: 'Containers',
    cover: 'needed for cover',
    buffer: 'needed for the buffer',
    needed: 'needed in the loop, the larger of the two',
    poolSize: 'pool size, with those held and in repair',
    poisson: 'needed if they came back one at a time (Palm)',
    fallbackNeeded: 'share that finds none, with the needed size',
    fallbackToday: 'share that finds none, with today’s pool',
  },

  curve: 'What a pool of this size does',
  curveCover: 'chance that a day’s dispatch finds enough empties',
  curveFallback: 'share of loads that go out in one-way packaging',
  curveX: 'Pool size',
  today: (units: number) => `today ${formatUnits(units)}`,
  needed: (units: number) => `needed ${formatUnits(units)}`,
  summaryNeeded: (size: number, cover: number, fallback: number) =>
    `A pool of ${formatUnits(size)} finds enough empties for a day’s dispatch with a chance of ${share(cover)}; ${share(fallback)} of loads find none and go out one-way.`,
  summaryToday: (size: number, cover: number, fallback: number) =>
    `Today’s ${formatUnits(size)}: ${share(cover)} and ${share(fallback)}.`,
  summaryNoToday: 'The book holds none today.',

  running: 'What running short costs',
  runningLead:
    'The share of loads that find no empty, times the trips a year, times what one trip in one-way packaging costs you. Enter that cost; it is not kept.',
  oneWayCost: 'One-way packaging for one load',
  runningHead: 'Pool',
  runningToday: 'with today’s pool',
  runningNeeded: 'with the needed pool',
  runningYear: (money: string) => `${money} a year`,
  runningFrom: (of: number, trips: number) =>
    `${share(of)} of ${formatUnits(Math.round(trips))} loads a year`,

  how: 'How this is reckoned',
  reckoned: {
    head: 'Step',
    with: 'With this type’s figures',
    value: 'Result',
    perDay: 'Containers a day, m = Σ parts a day ÷ parts in a container',
    spread: 'Variance of a day, v = Σ (sd ÷ parts in a container)²',
    loop: 'Loop time: sum of the legs; sd = √ of the sum of squares',
    average: 'In the loop on average = m × loop time (Little’s law)',
    peakMean:
      'Peak after a day’s dispatch, mean = m Σ p(k), with p(k) the chance that a loop takes longer than k days',
    peakVariance: {
      independent: 'Peak, variance = Σ (v p(k)² + m p(k) (1 − p(k))): they come back one by one',
      together: 'Peak, variance = Σ ((v + m²) p(k) − m² p(k)²): they come back as a truckload',
    },
    distribution: {
      poisson: 'Mean and variance are equal: Poisson (Palm’s theorem)',
      'negative binomial': 'The variance is larger than the mean: negative binomial',
      normal: 'The variance is smaller than the mean: normal, with continuity correction',
    },
    cover: (cover: number) =>
      `Needed for cover: the smallest number that holds with a chance of ${formatShare(cover)}`,
    buffer: 'Needed for the buffer = m × (loop time + buffer), rounded up',
    size: 'Pool size = needed ÷ (1 − held − repair), rounded up',
    palm: 'One at a time: the same cover for Poisson with the average in the loop',
    erlang:
      'Share that finds none: Erlang’s B formula with the load m × loop time and the containers of the loop',
    replaced: 'Replaced a year = m × working days × lost a trip',
    trips: 'Trips each a year = m × working days ÷ pool size',
  },
  sources:
    'Sources: Little, J. D. C., A proof for the queuing formula L = λW, Operations Research 9 (1961). Palm, C., Intensity variations in telephone traffic, Ericsson Technics 44 (1943). Erlang, A. K., Solution of some problems in the theory of probabilities of significance in automatic telephone exchanges (1917). The loop time is taken as gamma distributed with its mean and sd; all days are working days.',

  approvals: 'Approved sizes',
  approvalsNone: 'No size has been approved yet.',
  approvalLine: (by: string, day: string) => `${by}, ${formatDay(day)}`,
  approvalNeeded: (needed: number) => `reckoned then: ${formatUnits(needed)}`,
  approvalFrom: 'What it was reckoned from',
  approvalFacts: (result: {
    containersPerDay: number;
    loopDays: number;
    neededForCover: number;
    neededForBuffer: number;
  }) =>
    `${formatNumber(result.containersPerDay)} containers a day, loop ${formatNumber(result.loopDays)} days, ${formatUnits(result.neededForCover)} for cover, ${formatUnits(result.neededForBuffer)} for the buffer.`,
  levelColumns: { site: 'Site', level: 'Level', units: 'Now', standing: 'Stands' },
  level: (minimum: number, maximum: number) => `${formatUnits(minimum)}\u00a0to\u00a0${formatUnits(maximum)}`,
  movementsAt: (units: number, site: string) => `${formatUnits(units)} at ${site}, the movements behind it`,
  levelLine: (site: string, { minimum, maximum }: { minimum: number; maximum: number }) =>
    `${site}: ${formatUnits(minimum)} to ${formatUnits(maximum)}`,
  levels: 'Who is under or over',
  levelsNone: 'No levels are approved for this type.',
  under: (units: number) => `${formatUnits(units)} under`,
  over: (units: number) => `${formatUnits(units)} over`,
  within: 'within',
  noLevel: 'no level',

  approveTitle: 'Approve a pool size',
  approveLead: (size: number, inPool: number) =>
    `Reckoned: ${formatUnits(size)}. In the pool today: ${formatUnits(inPool)}. What you approve is kept with what it was reckoned from.`,
  approveForm: {
    size: 'Approved size',
    sizeHint: 'As reckoned, or another number with a note why.',
    note: 'Note',
    levels: 'Minimum and maximum of each site',
    levelsHint:
      'From then on Today shows which site is under or over. Take out the sites that need no level.',
    minimum: 'Minimum',
    maximum: 'Maximum',
    now: (units: number) => `there now: ${formatUnits(units)}`,
    remove: (site: string) => `No level for ${site}`,
    add: (site: string) => `Add a level for ${site}`,
  },
  approveNow: 'Approve',
  approvedNow: (size: number) => `Approved: ${formatUnits(size)}.`,
} as const;
