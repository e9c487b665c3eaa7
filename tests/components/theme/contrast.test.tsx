import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { usedPairs } from '@/components/theme/meaning';
import { palette, type ThemeName } from '@/components/theme/palette';

/** Relative luminance and contrast ratio as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => parseInt(hex.slice(at, at + 2), 16) / 255)
    .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(one: string, other: string): number {
  const [light = 0, dark = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (light + 0.05) / (dark + 0.05);
}

const themes = Object.keys(palette) as ThemeName[];

test('black on white has the ratio that WCAG states: 21', () => {
  expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 5);
});

test.each(themes)('in the %s theme every pair of text and ground that is used can be read', (theme) => {
  const colours = palette[theme];
  const tooFaint = usedPairs
    .map((pair) => ({ ...pair, ratio: contrast(colours[pair.text], colours[pair.ground]) }))
    .filter((pair) => pair.ratio < pair.least);
  expect(tooFaint).toEqual([]);
});

test('the style sheet holds the colours of the palette', () => {
  const sheet = readFileSync(join(__dirname, '../../../components/theme/colours.css'), 'utf8');
  const [light = '', dark = '', byDevice = ''] = sheet.split(/(?=:root\[data-theme)|(?=@media)/);
  const variables = (part: string) =>
    Object.fromEntries(
      [...part.matchAll(/--([a-z-]+): (#[0-9a-f]{6});/g)].map(([, name, value]) => [
        name,
        value?.toUpperCase(),
      ]),
    );
  expect(variables(light)).toEqual(palette.light);
  expect(variables(dark)).toEqual(palette.dark);
  expect(variables(byDevice)).toEqual(palette.dark);
});
