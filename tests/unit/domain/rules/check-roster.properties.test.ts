import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { RosterLine } from '@/lib/domain/roster/player';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import { compileRuleSet } from '@/lib/domain/rules/compile-rule-set';
import { findingSchema, type Finding } from '@/lib/domain/rules/finding';
import { jersey } from '../../../factories/rule-set';
import { roster, rosterLine, ruleSet } from '../../../support/arbitrary-rosters';

const garments = [jersey, { ...jersey, code: 'constructor', name: 'Odd garment' }];
const codesOf = (findings: readonly Finding[], row: number): string[] =>
  findings.filter((finding) => finding.row === row).map(({ code, field }) => `${field} ${code}`);

describe('checkRoster, for any roster and any rules', () => {
  it('gives findings of the stated shape, whole sentences, and a summary that adds up', () => {
    fc.assert(
      fc.property(ruleSet, roster, (rules, players) => {
        const { findings, summary } = checkRoster(rules, players, garments);
        for (const finding of findings) {
          findingSchema.parse(finding);
          expect(finding.message).toMatch(/^\S.{8,}[.]$/su);
          expect(finding.row === null).toBe(finding.field === 'roster');
          expect(finding.garment !== undefined).toBe(finding.field === 'sizes');
          expect(finding.row ?? 0).toBeLessThan(Math.max(1, players.length));
        }
        expect(summary.blockers + summary.cautions + summary.notes).toBe(findings.length);
        const marked = new Set(findings.flatMap(({ row }) => (row === null ? [] : [row])));
        expect(summary).toMatchObject({ players: players.length, clean: players.length - marked.size });
      }),
    );
  });

  it('answers the same twice, prepared or not', () => {
    fc.assert(
      fc.property(ruleSet, roster, (rules, players) => {
        const first = checkRoster(rules, players, garments);
        expect(checkRoster(compileRuleSet(structuredClone(rules)), players, garments)).toEqual(first);
      }),
    );
  });

  it('finds the same of each player in whatever order they stand', () => {
    fc.assert(
      fc.property(
        ruleSet,
        roster.chain((players) =>
          fc.tuple(
            fc.constant(players),
            fc.shuffledSubarray([...players.keys()], { minLength: players.length }),
          ),
        ),
        (rules, [players, order]) => {
          const before = checkRoster(rules, players, garments).findings;
          const shuffled = order.flatMap((at) => players[at] ?? []);
          const after = checkRoster(rules, shuffled, garments).findings;
          order.forEach((was, is) => expect(codesOf(after, is)).toEqual(codesOf(before, was)));
        },
      ),
    );
  });

  it('keeps every finding of the others, but for roster limits and roles, when a player is added', () => {
    fc.assert(
      fc.property(ruleSet, roster, rosterLine, (rules, players, late) => {
        const before = checkRoster(rules, players, garments).findings;
        const after = checkRoster(rules, [...players, late], garments).findings;
        players.forEach((_, row) =>
          expect(codesOf(after, row)).toEqual(expect.arrayContaining(codesOf(before, row))),
        );
      }),
    );
  });

  it('suggests only what puts the cell right', () => {
    fc.assert(
      fc.property(ruleSet, roster, (rules, players) => {
        for (const finding of checkRoster(rules, players, garments).findings) {
          for (const suggestion of finding.suggestions) {
            const changed = takeSuggestion(players, finding, suggestion);
            const left = checkRoster(rules, changed, garments).findings.filter(
              ({ row, field, garment }) =>
                row === finding.row && field === finding.field && garment === finding.garment,
            );
            expect(left).toEqual([]);
          }
        }
      }),
      { numRuns: 60 },
    );
  });
});

function takeSuggestion(players: readonly RosterLine[], finding: Finding, suggestion: string): RosterLine[] {
  return players.map((player, row) => {
    if (row !== finding.row) return player;
    if (finding.field === 'sizes' && finding.garment !== undefined) {
      return { ...player, sizes: { ...player.sizes, [finding.garment]: suggestion } };
    }
    return { ...player, [finding.field]: suggestion };
  });
}
