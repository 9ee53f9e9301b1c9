import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chooseKits, compareKits, numberContrast } from '@/lib/domain/kit/kit-clash';
import type { Kit } from '@/lib/domain/kit/kit';

const kit = (name: string, body: string, rest: Partial<Kit> = {}): Kit => ({
  name,
  body,
  sleeves: body,
  number: '#ffffff',
  outline: null,
  ...rest,
});
const navy = kit('navy', '#14375e');
const black = kit('black', '#111111');
const white = kit('white', '#ffffff', { number: '#111111' });
const yellow = kit('yellow', '#f4c430');
const cream = kit('cream', '#fff6d5', { number: '#111111' });

describe('compareKits', () => {
  it('calls two bodies that look alike a clash, nearly alike close, and different ones clear', () => {
    expect(compareKits(white, cream)).toMatchObject({
      verdict: 'clash',
      says: 'White and cream are too alike to tell the teams apart.',
    });
    expect(compareKits(navy, black)).toMatchObject({ verdict: 'close' });
    expect(compareKits(navy, yellow)).toMatchObject({
      verdict: 'clear',
      says: 'Navy and yellow are easy to tell apart.',
    });
  });

  it('warns of sleeves that look like the other body without changing the verdict', () => {
    const sleeved = kit('white with navy sleeves', '#ffffff', { sleeves: '#14375e' });
    expect(compareKits(sleeved, navy)).toMatchObject({
      verdict: 'clear',
      says: 'White with navy sleeves and navy are easy to tell apart. The sleeves of white with navy sleeves look like navy.',
    });
    expect(compareKits(navy, sleeved).says).toMatch(
      /The sleeves of white with navy sleeves look like navy\.$/,
    );
    const other = kit('yellow with navy sleeves', '#f4c430', { sleeves: '#14375e' });
    expect(compareKits(sleeved, other).says).toMatch(/Their sleeves look alike\.$/);
  });

  it('gives the same difference whichever kit comes first, and none for a kit and itself', () => {
    const hex = fc
      .integer({ min: 0, max: 0xffffff })
      .map((value) => `#${value.toString(16).padStart(6, '0')}`);
    fc.assert(
      fc.property(hex, hex, (a, b) => {
        const there = compareKits(kit('a', a), kit('b', b));
        const back = compareKits(kit('b', b), kit('a', a));
        expect(there.deltaE).toBeCloseTo(back.deltaE, 9);
        expect(there.deltaE).toBeGreaterThanOrEqual(0);
        expect(compareKits(kit('a', a), kit('a', a)).deltaE).toBe(0);
      }),
    );
  });
});

describe('numberContrast', () => {
  it('tells a number that stands out from one that does not', () => {
    expect(numberContrast(navy)).toMatchObject({ verdict: 'clear' });
    expect(numberContrast(kit('pale yellow', '#fffbe0'))).toMatchObject({ verdict: 'poor' });
  });

  it('never rounds over a limit: 4.499 is not 4.5 and 2.999 is not 3', () => {
    const greys = Array.from(
      { length: 256 },
      (_, level) => `#${level.toString(16).padStart(2, '0').repeat(3)}`,
    );
    for (const grey of greys) {
      const { ratio, verdict, says } = numberContrast(kit('grey', grey));
      expect(verdict).toBe(ratio >= 4.5 ? 'clear' : ratio >= 3 ? 'thin' : 'poor');
      const printed = Number(/\(([0-9.]+) to 1\)/.exec(says)?.[1]);
      expect(printed).toBeLessThanOrEqual(ratio);
    }
  });

  it('does not let an outline rescue a number of the body colour', () => {
    expect(numberContrast(kit('navy', '#14375e', { number: '#14375e', outline: '#ffffff' }))).toMatchObject({
      ratio: 1,
      verdict: 'poor',
      says: 'The number on navy is hard to read (1 to 1).',
    });
  });
});

describe('chooseKits', () => {
  it('leaves everybody in the kit they bring when that is clear', () => {
    const choice = chooseKits({ home: navy, away: white }, { home: black, away: yellow });
    expect(choice.pairings).toHaveLength(4);
    expect(choice.chosen).toMatchObject({ home: 'home', away: 'away', changes: 'nobody' });
    expect(choice.says).toBe('Nobody changes: the home team wears navy, the away team yellow.');
  });

  it('sends the away team to its home kit before it asks the home team to change', () => {
    const choice = chooseKits({ home: navy, away: yellow }, { home: white, away: black });
    expect(choice.says).toBe(
      'The away team changes to its home kit: the home team wears navy, the away team white.',
    );
  });

  it('asks the home team to change when the away team has nothing that helps', () => {
    const choice = chooseKits({ home: navy, away: white }, { home: black, away: null });
    expect(choice.chosen).toMatchObject({ home: 'away', away: 'home', changes: 'home' });
    expect(choice.says).toBe(
      'The home team changes to its away kit: the home team wears white, the away team black.',
    );
  });

  it('asks both to change as the last way out', () => {
    const [ink, slate, grey, silver] = ['#111111', '#474747', '#808080', '#b4b4b4'].map((body, i) =>
      kit(`grey ${i + 1}`, body),
    );
    if (!ink || !slate || !grey || !silver) throw new Error('four greys');
    const choice = chooseKits({ home: grey, away: ink }, { home: silver, away: slate });
    expect(choice.chosen).toMatchObject({ changes: 'both', homeKit: ink, awayKit: silver });
    expect(choice.says).toBe('Both teams change: the home team wears grey 1, the away team grey 4.');
  });

  it('says so when no pairing is clear, and names the least alike', () => {
    const stuck = chooseKits({ home: white, away: null }, { home: cream, away: null });
    expect(stuck.chosen).toBeNull();
    expect(stuck.says).toBe(
      'No two kits of these teams are clearly different. The least alike are white for the home team and cream for the away team; bring bibs.',
    );
  });
});
