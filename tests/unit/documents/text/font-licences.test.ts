import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const folder = 'lib/documents/fonts';
const files = readdirSync(folder);
const family = (name: string) => name.replace(/^OFL-|\.txt$|_.*$|ExtraCondensed/g, '');

describe('fonts for documents', () => {
  it('lie beside their open licence, and no licence is without its font', () => {
    const fonts = new Set(files.filter((name) => name.endsWith('.ttf')).map(family));
    const licences = files.filter((name) => name.endsWith('.txt'));
    expect(new Set(licences.map(family))).toEqual(fonts);
    expect(fonts.size).toBe(6);
    for (const name of licences) {
      expect(readFileSync(`${folder}/${name}`, 'utf8')).toContain('SIL OPEN FONT LICENSE Version 1.1');
    }
  });
});
