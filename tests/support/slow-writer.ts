import pg from 'pg';
import { someKit } from '../factories/league';
import { getTestUrls, queryAsAdmin } from './database';

/**
 * Somebody who is adding a team and is slow: they hold the season until `work`, which they start meanwhile, waits for
 * them; then the team is there and `work` goes on. Gives what `work` came to.
 */
export async function whileTeamIsAdded<T>(
  place: { leagueId: string; seasonId: string; divisionId: string },
  team: { name: string; slug: string },
  work: () => Promise<T>,
): Promise<PromiseSettledResult<T>> {
  const writer = new pg.Client({ connectionString: getTestUrls().appUrl });
  await writer.connect();
  try {
    await writer.query('begin');
    await writer.query(`select set_config('app.league_id', $1, true)`, [place.leagueId]);
    await writer.query('select 1 from seasons where id = $1 for update', [place.seasonId]);
    let over = false;
    const outcome = Promise.allSettled([work()]).then(([only]) => {
      over = true;
      return only as PromiseSettledResult<T>;
    });
    while (!over && !(await somebodyWaits()));
    await writer.query(
      `with made as (
         insert into teams (league_id, id, season_id, division_id, slug, name, home_kit, created_at)
         values ($1, gen_random_uuid(), $2, $3, $4, $5, $6, now()) returning league_id, id
       )
       insert into rosters (league_id, id, team_id, state, updated_at)
       select league_id, gen_random_uuid(), id, 'open', now() from made`,
      [place.leagueId, place.seasonId, place.divisionId, team.slug, team.name, JSON.stringify(someKit)],
    );
    await writer.query('commit');
    return await outcome;
  } finally {
    await writer.end();
  }
}

const somebodyWaits = async (): Promise<boolean> => {
  const waiting = await queryAsAdmin(
    `select 1 from pg_stat_activity where datname = current_database() and wait_event_type = 'Lock'`,
  );
  return waiting.length > 0;
};
