import { readFileSync } from 'node:fs';
import { join } from 'node:path';

/*
 * Contrast of the theme's colours. Source of formula and limits: W3C, Web Content Accessibility Guidelines 2.2,
 * "relative luminance" and "contrast ratio"; success criteria 1.4.3 (text 4.5:1) and 1.4.11 (outlines of fields 3:1).
 */

type Colours = Readonly<Record<string, string>>;

const sheet = readFileSync(join(__dirname, '_tokens.scss'), 'utf8');

function coloursOf(theme: 'light' | 'dark'): Colours {
  const pairs = [...sheet.matchAll(/--sw-([a-z0-9-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\)/g)];
  return Object.fromEntries(pairs.map(([, name, light, dark]) => [name, theme === 'light' ? light : dark]));
}

function luminance(colour: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => parseInt(colour.slice(at, at + 2), 16) / 255)
    .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(one: string, other: string): number {
  const [light = 0, dark = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (light + 0.05) / (dark + 0.05);
}

const grounds = ['paper', 'board', 'wash'];
const texts = ['ink', 'ink-2', 'spruce', 'twine', 'slate', 'plum', 'brick'];
const textPairs = [
  ...texts.flatMap((text) => grounds.map((ground) => [text, ground])),
  ...['spruce', 'twine', 'slate', 'plum', 'brick'].flatMap((tone) => [
    [tone, `${tone}-wash`],
    ['ink', `${tone}-wash`],
  ]),
  ['ink-2', 'spruce-wash'],
  ['on-spruce', 'spruce'],
  ['on-brick', 'brick'],
];

describe.each(['light', 'dark'] as const)('%s theme', (theme) => {
  const colours = coloursOf(theme);
  const ratio = ([one = '', other = '']: readonly string[]): number =>
    contrast(colours[one] ?? '', colours[other] ?? '');

  it('has the ratio of black on white at 21', () => {
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 10);
  });

  it.each(textPairs)('%s on %s can be read', (...pair) => {
    expect(ratio(pair)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(grounds)('a field’s edge is seen on %s', (ground) => {
    expect(ratio(['edge', ground])).toBeGreaterThanOrEqual(3);
  });
});
