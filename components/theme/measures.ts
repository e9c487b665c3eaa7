/** Sizes of LOOK.md, in px. */
export const space = { xs: 4, s: 8, m: 12, l: 16, xl: 24, xxl: 32, xxxl: 48 } as const;
export type Space = keyof typeof space;

export const typeSize = {
  small: 13,
  body: 15,
  large: 17,
  title: 20,
  head: 26,
  figure: 34,
  hero: 54,
} as const;
export type TypeSize = keyof typeof typeSize;

export const lineHeight = { text: 1.4, head: 1.15 } as const;
export const fontFamily = "'Tarekeep Sans', 'Lato', system-ui, sans-serif";
export const weight = { normal: '400', strong: '700', heavy: '900' } as const;
export const radius = 6;
/** Least side of anything that is pressed. */
export const target = 44;
/** Widest column that text is read in. */
export const column = 720;
