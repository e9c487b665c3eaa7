/** The only place with colour values in code; `colours.css` holds the same ones for the browser, and a test compares them. */
export const palette = {
  light: {
    paper: '#F7F4EC',
    card: '#FFFFFF',
    rule: '#DDD6C6',
    ink: '#1C2628',
    soft: '#56615F',
    spruce: '#0E5A50',
    'spruce-wash': '#DCEBE6',
    slate: '#2B506E',
    'slate-wash': '#DEE9F2',
    straw: '#7A5B00',
    'straw-wash': '#F5E9C3',
    kiln: '#A23E16',
    'kiln-wash': '#F8E2D6',
    plum: '#6A3670',
    'plum-wash': '#EFE1F1',
  },
  dark: {
    paper: '#141A1B',
    card: '#1D2527',
    rule: '#334043',
    ink: '#F1EDE3',
    soft: '#A9B3B0',
    spruce: '#6FC7B4',
    'spruce-wash': '#17382F',
    slate: '#93BEE0',
    'slate-wash': '#1D3345',
    straw: '#E4C35C',
    'straw-wash': '#3A3112',
    kiln: '#F0996F',
    'kiln-wash': '#46241A',
    plum: '#D7A6DC',
    'plum-wash': '#3A2340',
  },
} as const;

export type ThemeName = keyof typeof palette;
export type ColourName = keyof (typeof palette)['light'];
