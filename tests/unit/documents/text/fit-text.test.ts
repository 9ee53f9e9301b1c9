import fc from 'fast-check';
import { beforeAll, describe, expect, it } from 'vitest';
import {
  blockHeight,
  blockWidth,
  fitBlock,
  fitBox,
  fitSize,
  measureText,
  wrapText,
} from '@/lib/documents/text/fit-text';
import { makeTypeCase, type TypeCase } from '@/lib/documents/text/type-case';
import { hostileNames } from '@/tests/factories/snapshots';

let type: TypeCase;
beforeAll(async () => {
  type = await makeTypeCase([...hostileNames]);
});

const words = fc.oneof(
  fc.constantFrom(...hostileNames),
  fc.string({ unit: fc.constantFrom(...'abcdeWMil -ÅéüŁğ.,0123'), maxLength: 120 }),
);
const width = fc.double({ min: 12, max: 90, noNaN: true });

describe('setting text', () => {
  it('breaks any text into lines that fit and lose nothing', () => {
    fc.assert(
      fc.property(words, width, (text, room) => {
        const lines = wrapText(type, 'text', text, 10, room);
        for (const line of lines) expect(measureText(type, 'text', line, 10)).toBeLessThanOrEqual(room);
        const plain = (value: string) => value.normalize('NFC').replace(/[\s\u202a-\u202e]/g, '');
        expect(plain(lines.join(''))).toBe(plain(text));
      }),
      { numRuns: 300 },
    );
  });

  it('breaks at spaces and after hyphens before it breaks a word', () => {
    expect(wrapText(type, 'text', 'Fernández-Arróyabe Villaverde', 10, 25)).toEqual([
      'Fernández-',
      'Arróyabe',
      'Villaverde',
    ]);
  });

  it('makes a text smaller before it takes more lines, and keeps every line in its width', () => {
    fc.assert(
      fc.property(words, width, (text, room) => {
        const block = fitBlock(type, 'strong', text, { size: 20, smallest: 8, width: room, mostLines: 2 });
        expect(blockWidth(block)).toBeLessThanOrEqual(room + 1e-9);
        expect(block.size).toBeGreaterThanOrEqual(8);
        expect(block.lines.length <= 2 || block.size === 8).toBe(true);
      }),
      { numRuns: 200 },
    );
  });

  it('fits any text of 120 letters into the box of a label', () => {
    fc.assert(
      fc.property(words, (text) => {
        const block = fitBox(type, 'strong', text, { size: 20, width: 89.6, mostLines: 4, height: 15 });
        expect(blockWidth(block)).toBeLessThanOrEqual(89.6 + 1e-9);
        expect(blockHeight(block)).toBeLessThanOrEqual(15);
      }),
      { numRuns: 200 },
    );
  });

  it('shrinks one line to its width and leaves alone what fits', () => {
    expect(fitSize(type, 'figure', '7', 40, 50)).toBe(40);
    const size = fitSize(type, 'figure', '12345678901234567890', 40, 50);
    expect(measureText(type, 'figure', '12345678901234567890', size)).toBeLessThanOrEqual(50);
    expect(size).toBeGreaterThan(10);
  });
});
