import { formatUnits } from '../format';

type Account = { kind: string; name: string | null };

const outside: Record<string, string> = {
  bought: 'bought',
  scrapped: 'scrapped',
  lost: 'lost',
  found: 'found',
  opening: 'stock at the start',
};

export const balances = {
  head: { operator: 'Balances', partner: 'What you hold' },
  empty: 'No units in the book yet',
  emptyHint: {
    operator:
      'Each company and container type stands here once units have moved. Begin with the stock at your sites.',
    partner: 'Each container type stands here once units are on their way to you.',
  },
  search: 'Company',
  filter: { type: 'Container type', asOf: 'At the end of' },
  column: {
    company: 'Company',
    type: 'Container type',
    held: { operator: 'Holds', partner: 'You hold' },
    atSites: { operator: 'At its sites', partner: 'At your sites' },
    sent: 'Sent, not yet counted',
    toIt: { operator: 'On the way to it', partner: 'On the way to you' },
    inQuestion: 'In question',
  },
  adjust: 'Adjust stock',
  detailHead: (type: string) => type,
  holds: (units: number) => `holds ${formatUnits(units)}`,
  now: 'now',
  asOf: (day: string) => `at the end of ${day}`,
  partsHead: 'What the number is made of',
  where: 'Where',
  units: 'Units',
  part: {
    atSites: 'at the sites',
    sent: 'sent, not yet counted',
    sentDiffers: 'sent, counted otherwise, not settled',
    toIt: 'on the way there',
    toItDiffers: 'sent there, counted otherwise, not settled',
  },
  typeCode: 'Type',
  held: 'Holds',
  notHeld: 'Not yet held',
  heldNote:
    'A company answers for what is at its sites and for what it has sent, until the receiver has counted it.',
  movementsHead: (part: string) => `Movements: ${part}`,
  noMovements: 'No movements here',
  noMovementsHint: 'Nothing has moved in this part of the balance up to that day.',
  movement: {
    day: 'Day',
    kind: 'What happened',
    from: 'From',
    to: 'To',
    units: 'Units',
    shipment: 'Shipment',
    by: 'By',
  },
  entry: (id: number) => `entry ${formatUnits(id)}`,
  corrects: (id: number) => `corrects entry ${formatUnits(id)}`,
  /** Where units stand: a site by its name, a shipment as being on the way, or outside the loop. */
  place: ({ kind, name }: Account) => {
    if (kind === 'transit') return `on the way, ${name ?? ''}`;
    return name ?? outside[kind] ?? kind;
  },

  adjustLead:
    'For what comes into the pool or leaves it other than by a shipment. The entry stays; a mistake is taken back by another.',
  form: {
    kind: 'What happened',
    site: 'Site',
    type: 'Container type',
    units: 'Units',
    on: 'On',
    reason: 'Reason',
    reasonHint: 'One sentence that a colleague will understand in a year.',
    submit: 'Book it',
  },
  kind: {
    bought: 'bought: new units come into the pool',
    scrapped: 'scrapped: units are done for',
    found: 'found: more there than the book says',
    lost: 'lost: fewer there than the book says',
    opening: 'stock at the start: there before the book began',
  },
  partnerNote:
    'At a partner’s site, lost and found enter its assessment: deposit, loss charge and credit follow by its terms.',
  booked: (units: number, entry: number) => `Booked ${formatUnits(units)} under entry ${formatUnits(entry)}.`,
  bookAnother: 'Book another',
  toBalances: 'Open the balances',
  takeBack: 'Take back',
  takeBackOf: (entry: number) => `Take back entry ${formatUnits(entry)}`,
  takeBackHead: (entry: number) => `Take back entry ${formatUnits(entry)}`,
  takeBackLead: 'An entry that undoes it is posted on the same day and names it. Both stay in the book.',
  takeBackReason: 'Why',
  takeBackDo: 'Post the entry',
} as const;
