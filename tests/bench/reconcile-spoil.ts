import type { Draw } from './reconcile-draw';

export interface Line {
  type: string;
  quantity: number;
}

const LOOK_ALIKES: Record<string, string> = {
  '0': 'O',
  '1': 'I',
  '5': 'S',
  '8': 'B',
  O: '0',
  I: '1',
  S: '5',
  B: '8',
};

const put = (text: string, at: number, { cut, by }: { cut: number; by: string }) =>
  text.slice(0, at) + by + text.slice(at + cut);

/** One character, anywhere, dropped, changed, swapped with the next, or read as its look-alike. */
export function mistype(draw: Draw, text: string): string {
  for (;;) {
    const at = draw.whole(0, text.length - 1);
    const here = text.charAt(at);
    const next = text.charAt(at + 1);
    const kind = draw.one(['drop', 'change', 'swap', 'look-alike'] as const);
    if (kind === 'drop') return put(text, at, { cut: 1, by: '' });
    if (kind === 'change') {
      const by = /\d/.test(here) ? draw.one([...'0123456789']) : draw.one([...'ABCDEFGHKLMNPRSTUVWXYZ']);
      if (by !== here) return put(text, at, { cut: 1, by });
    }
    if (kind === 'swap' && next !== '' && next !== here) return put(text, at, { cut: 2, by: next + here });
    const alike = LOOK_ALIKES[here];
    if (kind === 'look-alike' && alike) return put(text, at, { cut: 1, by: alike });
  }
}

/** The same reference in another hand. */
export function restyle(draw: Draw, text: string): string {
  const styles: ((text: string) => string)[] = [
    (t) => t.toLowerCase(),
    (t) => t.replaceAll('-', ''),
    (t) => t.replaceAll('-', ' '),
    (t) => ` ${t} `,
    (t) => t.replace(/^([^\d]*)0+(?=\d)/, '$1'),
    (t) => t.replace(/^[^\d]+/, ''),
    (t) => t.replace(/^[^\d]*0*(?=\d)/, ''),
    (t) => t.replace(/(\d{3})(?=\d{3}$)/, '$1 '),
    (t) => t.toLowerCase().replaceAll('-', ' '),
  ];
  return draw.one(styles)(text);
}

export const joinReferences = (draw: Draw, first: string, second: string): string =>
  first + draw.one([' + ', '+', ' / ', '/', ', ', ',', ' & ', ' and ', ' ']) + second;

const clone = (lines: readonly Line[]) => lines.map((line) => ({ ...line }));

/** 3 % of lines miscounted by a few, 0.5 % with a wrong type (RULES 5). */
export function miscount(draw: Draw, lines: readonly Line[], types: readonly string[]): Line[] {
  const counted = clone(lines);
  for (const line of counted) {
    const few = draw.one([-8, -5, -3, -2, -1, 1, 2, 3, 5]);
    // Nobody takes eleven for six: a few is at most a quarter of the line.
    if (draw.chance(0.03) && 4 * Math.abs(few) <= line.quantity) line.quantity += few;
    if (draw.chance(0.005)) line.type = draw.one(types.filter((type) => type !== line.type));
  }
  return merged(counted);
}

/** Two parts that add up to the whole: by quantity, or by line where there are several. */
export function cutInTwo(draw: Draw, lines: readonly Line[]): [Line[], Line[]] {
  if (lines.length > 1 && draw.chance(0.4)) {
    const at = draw.whole(1, lines.length - 1);
    return [clone(lines.slice(0, at)), clone(lines.slice(at))];
  }
  const share = draw.one([0.5, 0.5, 0.4, 0.6, 0.7, 0.25]);
  const first = lines.map(({ type, quantity }) => ({ type, quantity: Math.floor(quantity * share) }));
  const second = lines.map(({ type, quantity }, at) => ({
    type,
    quantity: quantity - (first[at]?.quantity ?? 0),
  }));
  const filled = (part: Line[]) => part.filter(({ quantity }) => quantity > 0);
  return [filled(first), filled(second)];
}

export function merged(lines: readonly Line[]): Line[] {
  const units = new Map<string, number>();
  for (const { type, quantity } of lines) units.set(type, (units.get(type) ?? 0) + quantity);
  return [...units].map(([type, quantity]) => ({ type, quantity }));
}
