import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberContrast } from '@/lib/domain/kit/kit-clash';
import { kitSchema } from '@/lib/domain/kit/kit';
import { makeKitOfColours, undecidedKit } from '@/lib/domain/kit/kit-of-colours';

describe('a kit made of one colour', () => {
  it('has a number that stands out well on it, whatever the colour, and is a kit that can be stored', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 0xffffff }), (value) => {
        const colour = `#${value.toString(16).padStart(6, '0')}`;
        const kit = makeKitOfColours({ name: 'own', hex: colour }, null);
        expect(kitSchema.parse(kit)).toEqual(kit);
        expect(kit).toMatchObject({ body: colour, sleeves: colour, outline: null });
        expect(numberContrast(kit).verdict).toBe('clear');
      }),
    );
  });

  it('keeps the number colour that was named, even one that is hard to read', () => {
    const kit = makeKitOfColours({ name: 'white', hex: '#ffffff' }, { name: 'yellow', hex: '#f4f080' });
    expect(kit.number).toBe('#f4f080');
    expect(numberContrast(kit).verdict).toBe('poor');
  });

  it('has a name that fits, however long the colour was called', () => {
    const kit = makeKitOfColours({ name: 'very '.repeat(30), hex: '#14375e' }, null);
    expect(kitSchema.safeParse(kit).success).toBe(true);
  });
});

it('a team whose colours are not known yet wears a kit that can be stored and read', () => {
  expect(kitSchema.parse(undecidedKit)).toEqual(undecidedKit);
  expect(numberContrast(undecidedKit).verdict).toBe('clear');
});
