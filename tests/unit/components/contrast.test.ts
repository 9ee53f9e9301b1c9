import { readFileSync } from 'node:fs';
import { wcagContrast } from 'culori';
import { describe, expect, it } from 'vitest';

// Success criteria 1.4.3 (text, 4.5:1) and 1.4.11 (parts of controls and signs, 3:1) of the Web Content Accessibility
// Guidelines, version 2.2, W3C Recommendation, 12 December 2024.
const text = 4.5;
const sign = 3;

const css = readFileSync(`${import.meta.dirname}/../../../app/globals.css`, 'utf8');
const tokens = new Map(
  [...css.matchAll(/--([a-z-]+):\s*light-dark\((#[0-9a-f]{6}),\s*(#[0-9a-f]{6})\)/g)].map(
    ([, name = '', light = '', dark = '']) => [name, { light, dark }],
  ),
);

function readToken(name: string, scheme: 'light' | 'dark'): string {
  const token = tokens.get(name);
  if (token === undefined) throw new Error(`globals.css has no token --${name}`);
  return token[scheme];
}

const tones = ['stop', 'care', 'note', 'set'];
const grounds = ['cotton', 'card', 'linen'];

/** Every pair of text and ground that the components put together. */
const textPairs: [string, string][] = [
  ...['ink', 'dusk', 'damson', 'damson-deep', ...tones].flatMap((name) =>
    grounds.map((ground): [string, string] => [name, ground]),
  ),
  ...tones.flatMap((tone): [string, string][] => [
    [tone, `${tone}-wash`],
    ['ink', `${tone}-wash`],
    ['dusk', `${tone}-wash`],
  ]),
  ['damson', 'damson-wash'],
  ['damson-deep', 'damson-wash'],
  // Primary buttons with their hover and press, the inked line of the navigation with its count, toasts.
  ['on-ink', 'ink'],
  ['on-ink', 'damson'],
  ['on-ink', 'damson-deep'],
  ['stop-wash', 'ink'],
  // The number rail's "twice".
  ['on-ink', 'stop'],
  ['ink', 'hem'],
];

/** Shapes and edges that carry meaning by themselves: the focus ring, dashed marks, the boxes of choices. */
const signPairs: [string, string][] = [
  ...['damson', 'dusk', 'ink', ...tones].flatMap((name) =>
    grounds.map((ground): [string, string] => [name, ground]),
  ),
  ['card', 'stop'],
  ['card', 'care'],
  ['card', 'note'],
];

describe.each(['light', 'dark'] as const)('the %s tokens', (scheme) => {
  it.each(textPairs)('let %s be read on %s', (front, ground) => {
    expect(wcagContrast(readToken(front, scheme), readToken(ground, scheme))).toBeGreaterThanOrEqual(text);
  });

  it.each(signPairs)('let %s be told from %s', (front, ground) => {
    expect(wcagContrast(readToken(front, scheme), readToken(ground, scheme))).toBeGreaterThanOrEqual(sign);
  });
});

it('every colour token has a light and a dark value', () => {
  const declared = [...css.matchAll(/^ {2}--([a-z-]+):/gm)]
    .map(([, name]) => name)
    .filter((name) => !name?.startsWith('font-'));
  expect(new Set(declared)).toEqual(new Set(tokens.keys()));
  expect(tokens.size).toBe(19);
});
