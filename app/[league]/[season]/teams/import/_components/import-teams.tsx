'use client';

import { useRouter } from 'next/navigation';
import { useMemo, useState } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { SelectField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { useToast } from '@/components/ui/toast';
import type { Kit, TeamKits } from '@/lib/domain/kit/kit';
import { teamFields } from '@/lib/domain/roster/import/heading-words';
import { listHeadings } from '@/lib/domain/roster/import/find-headings';
import { parseTable } from '@/lib/domain/roster/import/parse-table';
import { readTeams } from '@/lib/domain/roster/import/read-teams';
import { guessTeamMapping, type TeamColumn, type TeamMapping } from '@/lib/domain/roster/import/team-mapping';
import { countOf } from '@/lib/domain/text/count-of';
import type { LeagueAction } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';
import { ListSource } from '../../../_components/list-source';
import { useListSource } from '../../../_components/use-list-source';
import { planTeams } from './plan-teams';
import { TeamPlanTable } from './team-plan-table';

type Sheet = {
  name: string;
  rows: string[][];
  notes: string[];
  problems: { rowNumber: number; message: string }[];
};
type Sent = {
  season: string;
  teams: { name: string; divisionId: string; home: Kit | null; away: Kit | null }[];
  refused: number;
};

const columnWords: Record<TeamColumn, string> = {
  team: 'Team',
  division: 'Division',
  homeColour: 'Home colour',
  homeNumber: 'Home number colour',
  awayColour: 'Away colour',
  awayNumber: 'Away number colour',
  manager: 'Manager’s e-mail (invite on the People page)',
  extra: 'Nothing we know',
  'leave out': 'Leave it out',
};

/** From a file or a paste to teams: read, match the columns, see what would happen, then do it in one step. */
export function ImportTeams({
  league,
  season,
  divisions,
  known,
  onRead,
  onImport,
}: {
  league: string;
  season: string;
  divisions: { id: string; name: string }[];
  known: { name: string; divisionId: string; kits: TeamKits }[];
  onRead: LeagueAction<FormData, { ok: true; tables: Sheet[] } | { ok: false; message: string }>;
  onImport: LeagueAction<Sent, { added: number; changed: number; unchanged: number }>;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [sheets, setSheets] = useState<Sheet[]>([]);
  const [sheet, setSheet] = useState(0);
  const [mapping, setMapping] = useState<TeamMapping | null>(null);

  const { shown } = useListSource<Sheet[]>(
    {
      file: async (picked) => {
        const form = new FormData();
        form.set('file', picked);
        const answer = await onRead(league, form);
        if (!answer.ok) return { ok: false, message: answer.error.message };
        return answer.data.ok ? { ok: true, list: answer.data.tables } : answer.data;
      },
      paste: (text) => {
        const parsed = parseTable(text);
        if (!parsed.ok) return parsed;
        const { rows: cells, notes, problems } = parsed.table;
        return { ok: true, list: [{ name: 'your paste', rows: cells, notes, problems }] };
      },
    },
    (found) => {
      setSheets(found ?? []);
      setSheet(0);
      setMapping(found && guessTeamMapping(found[0]?.rows ?? []));
    },
  );

  const rows = sheets[sheet]?.rows;
  const plan = useMemo(() => {
    if (!rows || !mapping) return null;
    const taken = readTeams(rows, mapping, divisions);
    return { reading: taken, teams: planTeams(taken.lines, known) };
  }, [rows, mapping, divisions, known]);
  // Everything the reading has to say: of the file, of single rows, of the list as a whole.
  const said = [
    ...(sheets[sheet]?.notes ?? []),
    ...(sheets[sheet]?.problems ?? []).map((problem) => `Row ${problem.rowNumber}: ${problem.message}`),
    ...(plan?.reading.notes ?? []),
  ];
  const toSend = plan?.teams.filter((team) => team.fate !== 'twice') ?? [];
  const count = (fate: string) => plan?.teams.filter((team) => team.fate === fate).length ?? 0;
  const refused = (plan?.reading.refused.length ?? 0) + count('twice');

  const { submit, pending, failure } = useSubmit(
    () =>
      onImport(league, {
        season,
        refused,
        teams: toSend.map(({ name, divisionId, home, away }) => ({ name, divisionId, home, away })),
      }),
    ({ added, changed }) => {
      showToast({ tone: 'set', title: `${countOf(added, 'team')} added, ${changed} changed` });
      router.push(paths.teams(league, season));
      router.refresh();
      return 'leaving';
    },
  );

  return (
    <div className="grid gap-5">
      {divisions.length === 0 && (
        <Notice tone="care" title="No divisions yet">
          Every team belongs to a division. Add the divisions first, then bring in the teams.
        </Notice>
      )}
      <Card
        title="The list"
        aside={
          <a href="/samples/team-list.csv" download className="text-damson underline underline-offset-3">
            A sample list
          </a>
        }
      >
        <ListSource
          accepts={['.csv', '.tsv', '.txt', '.xlsx']}
          hint="CSV or XLSX, at most 5 MB."
          {...shown}
        />
      </Card>
      {rows && mapping && plan && (
        <>
          <Card title="Columns" aside={sheets[sheet]?.name}>
            {sheets.length > 1 && (
              <SelectField
                label="Sheet"
                className="mb-4 sm:max-w-80"
                options={sheets.map((entry, index) => ({ value: String(index), label: entry.name }))}
                value={String(sheet)}
                onChange={(event) => {
                  const next = Number(event.target.value);
                  setSheet(next);
                  setMapping(guessTeamMapping(sheets[next]?.rows ?? []));
                }}
              />
            )}
            <div className="grid gap-3 sm:grid-cols-2 lg:grid-cols-4">
              {listHeadings(rows, mapping.headerRow).headings.map((heading, column) => (
                <SelectField
                  key={column}
                  label={heading}
                  options={([...teamFields, 'extra', 'leave out'] as TeamColumn[]).map((value) => ({
                    value,
                    label: columnWords[value],
                  }))}
                  value={mapping.columns[column] ?? 'extra'}
                  onChange={(event) => {
                    const chosen = event.target.value as TeamColumn;
                    setMapping({
                      ...mapping,
                      // A thing stands in one column; choosing it here lets the other one go.
                      columns: mapping.columns.map((entry, at) =>
                        at === column
                          ? chosen
                          : entry === chosen && chosen !== 'extra' && chosen !== 'leave out'
                            ? 'extra'
                            : entry,
                      ),
                    });
                  }}
                />
              ))}
            </div>
            {said.length > 0 && (
              <ul className="text-dusk type-small mt-3 list-disc pl-5">
                {said.map((note) => (
                  <li key={note}>{note}</li>
                ))}
              </ul>
            )}
          </Card>
          <TeamPlanTable teams={plan.teams} refused={plan.reading.refused} divisions={divisions} />
          <FormFailure failure={failure} inputs={false} />
          <div className="flex flex-wrap items-center gap-4">
            <Button
              look="primary"
              pending={pending}
              onClick={() => void submit()}
              unavailable={
                count('added') + count('changed') === 0 ? 'There is nothing to add or change.' : undefined
              }
            >
              Import {countOf(count('added') + count('changed'), 'team')}
            </Button>
            <p className="text-dusk">
              {count('added')} new, {count('changed')} changed, {count('unchanged')} as they are, {refused}{' '}
              left out.
            </p>
          </div>
        </>
      )}
    </div>
  );
}
