import type { ColourName } from './palette';

const colour = (name: ColourName) => `var(--${name})`;

/** What a colour is for. Screens speak in these; the browser resolves them for the theme that is shown. */
export const meaning = {
  page: colour('paper'),
  surface: colour('card'),
  line: colour('rule'),
  text: colour('ink'),
  textSoft: colour('soft'),
  action: colour('spruce'),
  actionWash: colour('spruce-wash'),
  /** Text on a filled action: white on dark green by day, dark on light green by night. */
  onAction: colour('card'),
  plants: colour('spruce'),
  partners: colour('slate'),
  onTheWay: colour('straw'),
  inQuestion: colour('kiln'),
  inQuestionWash: colour('kiln-wash'),
} as const;

export type Tone = 'done' | 'open' | 'moving' | 'differs' | 'disputed';

/** The states of LOOK.md: line colour and wash of each. */
export const tones: Record<Tone, { line: string; wash: string }> = {
  done: { line: colour('spruce'), wash: colour('spruce-wash') },
  open: { line: colour('slate'), wash: colour('slate-wash') },
  moving: { line: colour('straw'), wash: colour('straw-wash') },
  differs: { line: colour('kiln'), wash: colour('kiln-wash') },
  disputed: { line: colour('plum'), wash: colour('plum-wash') },
};

/**
 * Every pair of text and ground that the components use, by palette name, and the contrast it needs (WCAG 2.2, 1.4.3 and 1.4.11).
 * A new pairing is added here, and the test reckons it.
 */
export const usedPairs: readonly { text: ColourName; ground: ColourName; least: 4.5 | 3 }[] = [
  ...(['paper', 'card'] as const).flatMap((ground) =>
    (['ink', 'soft', 'spruce', 'slate', 'straw', 'kiln', 'plum'] as const).map((text) => ({
      text,
      ground,
      least: 4.5 as const,
    })),
  ),
  ...(['spruce', 'slate', 'straw', 'kiln', 'plum'] as const).flatMap((name) => [
    { text: name, ground: `${name}-wash` as const, least: 4.5 as const },
    { text: 'ink' as const, ground: `${name}-wash` as const, least: 4.5 as const },
    { text: 'soft' as const, ground: `${name}-wash` as const, least: 4.5 as const },
    { text: 'card' as const, ground: name, least: 4.5 as const },
  ]),
  { text: 'paper', ground: 'ink', least: 4.5 },
];
