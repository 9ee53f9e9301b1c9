import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readColour } from '@/lib/domain/roster/import/read-colour';
import { readTeams } from '@/lib/domain/roster/import/read-teams';
import { guessTeamMapping, teamMappingSchema } from '@/lib/domain/roster/import/team-mapping';

const divisions = [
  { id: 'd1', name: 'U12 Girls' },
  { id: 'd2', name: 'U14 Boys' },
];
const read = (text: string, known = divisions) => {
  const rows = text.split('\n').map((row) => row.split(';'));
  return readTeams(rows, guessTeamMapping(rows), known);
};

describe('readColour', () => {
  it.each([
    ['#14375e', '#14375e', '#14375e'],
    ['14375E', '#14375e', '#14375e'],
    ['Navy (#14375E)', 'Navy', '#14375e'],
    ['sea mist #aabbcc', 'sea mist', '#aabbcc'],
    ['navy', 'navy', '#000080'],
    ['Royal-Blue', 'royal-blue', '#4169e1'],
    ['royalblue', 'royalblue', '#4169e1'],
  ])('reads %j', (text, name, hex) => {
    expect(readColour(text)).toEqual({ name, hex });
  });

  it.each(['', 'sea mist', '#123', '#12345', '#1234567', '14375eff', 'constructor'])(
    'does not read %j',
    (text) => {
      expect(readColour(text)).toBeNull();
    },
  );
});

describe('readTeams', () => {
  it('reads names, divisions, colours and managers', () => {
    const { lines, refused } = read(
      'Team;Division;Home colour;Number colour;Away colour;Manager email\nOtters;u12 girls;navy;#ffffff;White (#f4f4f0);Jo@Tern.example, bo@tern.example',
    );
    expect(refused).toEqual([]);
    expect(lines[0]?.line).toEqual({
      name: 'Otters',
      divisionId: 'd1',
      home: { colour: { name: 'navy', hex: '#000080' }, number: { name: '#ffffff', hex: '#ffffff' } },
      away: { colour: { name: 'White', hex: '#f4f4f0' }, number: null },
      managers: ['jo@tern.example', 'bo@tern.example'],
    });
  });

  it('refuses rows without a name, with an unknown division, or with a team that is there already', () => {
    const { lines, refused } = read(
      'Team;Division\nOtters;U12 Girls\n;U12 Girls\nHerons;U16\nOTTERS;U12 Girls\nOtters;U14 Boys\nGulls;\nTotal;5',
    );
    expect(lines.map(({ line }) => [line.name, line.divisionId])).toEqual([
      ['Otters', 'd1'],
      ['Otters', 'd2'],
    ]);
    expect(refused.map(({ rowNumber, reason }) => [rowNumber, reason])).toEqual([
      [3, 'This row names no team. Check which column holds the name of the team.'],
      [4, 'There is no division “U16”. Write one of these: U12 Girls and U14 Boys.'],
      [5, 'Row 2 has this team already.'],
      [7, 'This row names no division. Write one of these: U12 Girls and U14 Boys.'],
      [8, 'This row looks like a total, not a player or a team. Rename it if it is one.'],
    ]);
  });

  it('puts teams without a division in the only one there is', () => {
    expect(read('Team;Home colour\nOtters;red', [{ id: 'd1', name: 'Open' }]).lines[0]?.line.divisionId).toBe(
      'd1',
    );
  });

  it('says which of several addresses is none, and passes over the names beside them', () => {
    const { lines } = read('Team;Division;Manager\nOtters;U12 Girls;Jo Lee <jo@tern.example>, bo@tern');
    expect(lines[0]?.line.managers).toEqual(['jo@tern.example']);
    expect(lines[0]?.notes).toEqual(['“bo@tern” is no e-mail address, so nobody is invited there.']);
  });

  it('leaves a team in whose colour or address cannot be read, and says what was written', () => {
    const { lines } = read('Team;Division;Home colour;Manager\nOtters;U12 Girls;sea mist;call Jo');
    expect(lines[0]?.line).toMatchObject({ home: null, managers: [] });
    expect(lines[0]?.notes[0]).toContain('The home colour “sea mist” is no colour we know.');
    expect(lines[0]?.notes[1]).toContain('“call Jo” is no e-mail address');
  });

  it('accounts for every row of any table, and the guess always satisfies its schema', () => {
    const cell = fc.oneof(
      fc.constantFrom('', 'Team', 'Division', 'U12 Girls', 'Otters', 'red', 'Total', 'n'.repeat(81)),
      fc.string({ maxLength: 6 }),
    );
    fc.assert(
      fc.property(fc.array(fc.array(cell, { maxLength: 5 }), { maxLength: 10 }), (rows) => {
        const mapping = guessTeamMapping(rows);
        expect(teamMappingSchema.safeParse(mapping).success).toBe(true);
        const { lines, refused, counts } = readTeams(rows, mapping, divisions);
        expect(lines.length + refused.length + counts.blank + counts.headings + counts.aboveHeadings).toBe(
          rows.length,
        );
      }),
      { numRuns: 500 },
    );
  });
});
