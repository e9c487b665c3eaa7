/** What a line of money is about (RULES 3 and 4). */
export const lineComponents = [
  'deposits asked',
  'deposits released',
  'daily fee',
  'lost',
  'found again',
  'damage',
  'cleaning',
  'credit',
] as const;
export type LineComponent = (typeof lineComponents)[number];

/** One amount of one component, type and rate; `quantity` in units, for the daily fee in unit-days. */
export type Charge = {
  component: LineComponent;
  typeCode: string | null;
  /** Given for the daily fee only: one charge for each rate (RULES 3.8). */
  rate: string | null;
  quantity: number;
  amount: string;
};

/** Two charges with the same key are the same matter, in whatever month they were billed. */
export const keyOf = ({ component, typeCode, rate }: Omit<Charge, 'quantity' | 'amount'>): string =>
  JSON.stringify([component, typeCode, rate]);

/** In the order in which a statement shows its lines. */
export function byShownOrder(
  a: Pick<Charge, 'component' | 'typeCode'>,
  b: Pick<Charge, 'component' | 'typeCode'>,
): number {
  const order = lineComponents.indexOf(a.component) - lineComponents.indexOf(b.component);
  if (order !== 0) return order;
  const [left, right] = [a.typeCode ?? '', b.typeCode ?? ''];
  return left < right ? -1 : left > right ? 1 : 0;
}
