import { describe, expect, it } from 'vitest';
import { findStarterKit, starterKits } from '@/lib/domain/kit/starter-kits';
import { divisionFieldsSchema } from '@/lib/use-cases/divisions/division-schemas';

describe('a starter kit', () => {
  it('is accepted for a division as it stands', () => {
    for (const kit of starterKits) {
      const division = divisionFieldsSchema.safeParse({
        name: kit.name,
        ageBand: '',
        level: '',
        ruleSetId: '7b1f0f0e-5a57-4c0c-9f3b-0d3a53f0c001',
        leastPlayers: 5,
        mostPlayers: 12,
        freezesAt: null,
        garments: kit.garments,
      });
      expect(division.error?.issues, kit.name).toBeUndefined();
    }
  });

  it('has an id of its own, and something to wear at home and away', () => {
    expect(new Set(starterKits.map((kit) => kit.id)).size).toBe(starterKits.length);
    for (const kit of starterKits) {
      expect(findStarterKit(kit.id)).toBe(kit);
      const worn = kit.garments.map((garment) => garment.worn).join(' ');
      expect(worn).toContain('home');
      expect(worn).toContain('away');
    }
    expect(findStarterKit('nothing')).toBeUndefined();
  });
});
