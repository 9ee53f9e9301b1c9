import { listDivisionViews } from '@/db/queries/division-view';
import { findSeasonBySlug } from '@/db/queries/season-view';
import { listPlayersByRoster, listTeamViews, type TeamView } from '@/db/queries/team-view';
import { withLeague } from '@/db/tenant';
import { can } from '@/lib/domain/access/permissions';
import { chooseKits, compareKits, numberContrast } from '@/lib/domain/kit/kit-clash';
import type { Player } from '@/lib/domain/roster/player';
import { findAreaOf } from '@/lib/domain/readiness/judge-readiness';
import { checkRoster } from '@/lib/domain/rules/check-roster';
import type { Finding } from '@/lib/domain/rules/finding';
import { countOf } from '@/lib/domain/text/count-of';
import { splitPersonName } from '@/lib/domain/text/person-name';
import { joinWords } from '@/lib/domain/text/sentence';
import { notFound } from '@/lib/platform/errors';
import { assertCan, type ActorContext } from '../context';

/**
 * Two teams of one division before a match: who wears which number, every number that is twice or not allowed, and
 * whether the two kits can be told apart. `home` and `away` are slugs; without both, only the choice is returned.
 */
export async function checkMatch(
  ctx: ActorContext,
  input: { season: string; division: string | null; home: string | null; away: string | null },
) {
  assertCan(ctx.actor, 'match.check');
  return withLeague(ctx.league.id, async (tx) => {
    const season = await findSeasonBySlug(tx, input.season);
    if (!season) throw notFound('season');
    const divisions = await listDivisionViews(tx, season.id);
    const teams = await listTeamViews(tx, season.id, null);
    const division = divisions.find((entry) => entry.slug === input.division) ?? divisions[0];
    const inDivision = teams.filter((team) => team.divisionId === division?.id);
    const home = inDivision.find((team) => team.slug === input.home);
    const away = inDivision.find((team) => team.slug === input.away && team.slug !== input.home);
    const choice = {
      season: { slug: season.slug, name: season.name },
      divisions: divisions.map(({ slug, name }) => ({ slug, name })),
      division: division?.slug ?? null,
      teams: inDivision.map(({ slug, name, kits }) => ({ slug, name, kit: kits.home })),
      home: home?.slug ?? null,
      away: away?.slug ?? null,
    };
    if (!division || !home || !away) return { choice, match: null };

    const players = await listPlayersByRoster(tx, [home.roster.id, away.roster.id]);
    const side = (team: TeamView) =>
      makeSide(
        team,
        players.get(team.roster.id) ?? [],
        division,
        can(ctx.actor, 'match.check', { teamId: team.id }),
      );
    return {
      choice,
      match: {
        rules: division.rules ? `${division.ruleSetName}, version ${division.rules.version}` : null,
        home: side(home),
        away: side(away),
        asListed: compareKits(home.kits.home, away.kits.home),
        kits: chooseKits(home.kits, away.kits),
      },
    };
  });
}
export type MatchCheck = Awaited<ReturnType<typeof checkMatch>>;

type Division = Awaited<ReturnType<typeof listDivisionViews>>[number];

function makeSide(team: TeamView, players: readonly Player[], division: Division, mayName: boolean) {
  const { findings } = division.rules ? checkRoster(division.rules.ruleSet, players, []) : { findings: [] };
  // What concerns an official: numbers. Sizes, spellings and roster limits are the league's own business.
  const troubles = findings.filter(
    (finding) => findAreaOf(finding.code) === 'numbers' && finding.severity !== 'note',
  );
  return {
    name: team.name,
    slug: team.slug,
    state: team.roster.state,
    kits: team.kits,
    legibility: numberContrast(team.kits.home),
    // An official needs a number and a name to call, nothing else of a child; a manager gets no names of another team.
    players: players
      .map((player, row) => ({
        number: player.number,
        name: mayName ? callName(player) : '',
        trouble: troubles.some((finding) => finding.row === row),
      }))
      .sort((a, b) => orderOf(a.number) - orderOf(b.number) || b.number.length - a.number.length),
    troubles: mayName ? sayTroubles(troubles, players) : countTroubles(troubles.length),
  };
}
export type MatchSide = ReturnType<typeof makeSide>;

const orderOf = (number: string): number => (/^\d+$/.test(number) ? Number(number) : 1000);

const countTroubles = (count: number): string[] =>
  count === 0 ? [] : [`${countOf(count, 'number')} to check.`];

/** What an official would call: the surname, or the whole name where there is only one word. */
const callName = (player: Player): string => splitPersonName(player.name).surname || player.name || 'no name';

/** One sentence for each number worn twice, naming all who wear it, and one for each other trouble, naming the player. */
function sayTroubles(troubles: readonly Finding[], players: readonly Player[]): string[] {
  const wearers = new Map<string, string[]>();
  const others: string[] = [];
  for (const { code, row, message } of troubles) {
    const player = row === null ? undefined : players[row];
    if (!player) others.push(message);
    else if (code === 'number-repeated')
      wearers.set(player.number, [...(wearers.get(player.number) ?? []), callName(player)]);
    else others.push(`${callName(player)}: ${message}`);
  }
  const repeated = [...wearers].map(
    ([number, names]) =>
      `${number} is on ${names.length} shirts: ${joinWords(names)}. ${names.length === 2 ? 'One' : 'All but one'} must change before play.`,
  );
  return [...repeated, ...others];
}
