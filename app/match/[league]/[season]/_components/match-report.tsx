import type { CSSProperties } from 'react';
import { Card } from '@/components/ui/card';
import { joinClasses } from '@/components/ui/join-classes';
import { Notice } from '@/components/ui/notice';
import { StatusTag } from '@/components/ui/tag';
import type { Tone } from '@/components/ui/status-mark';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import type { Kit } from '@/lib/domain/kit/kit';
import { pickReadableInk } from '@/lib/domain/colour/readable-ink';
import { countOf } from '@/lib/domain/text/count-of';
import type { MatchCheck, MatchSide } from '@/lib/use-cases/match/check-match';

type Match = NonNullable<MatchCheck['match']>;

const kitTone: Record<Match['asListed']['verdict'], { tone: Tone; says: string }> = {
  clear: { tone: 'set', says: 'Kits clear' },
  close: { tone: 'care', says: 'Kits close' },
  clash: { tone: 'stop', says: 'Kits clash' },
};

/** The two sides of a match: what they wear, whether the kits can be told apart, and both rosters by number. */
export function MatchReport({ match }: { match: Match }) {
  const worn = match.kits.chosen;
  const verdict = kitTone[worn?.comparison.verdict ?? match.asListed.verdict];
  const deltaE = Math.round((worn?.comparison ?? match.asListed).deltaE);
  const troubles = match.home.players.concat(match.away.players).filter((player) => player.trouble).length;
  return (
    <div className="grid gap-4">
      <div className="border-hem rounded-card grid grid-cols-2 overflow-hidden border">
        <Half side={match.home} kit={worn?.homeKit ?? match.home.kits.home} wears={worn?.home ?? 'home'} />
        <Half
          side={match.away}
          kit={worn?.awayKit ?? match.away.kits.home}
          wears={worn?.away ?? 'home'}
          end
        />
      </div>
      <div className="flex flex-wrap gap-2">
        <StatusTag tone={verdict.tone}>
          {verdict.says}, ΔE {deltaE}
        </StatusTag>
        {troubles === 0 ? (
          <StatusTag tone="set">numbers clear</StatusTag>
        ) : (
          <StatusTag tone="stop">{countOf(troubles, 'number')} to put right</StatusTag>
        )}
      </div>
      <Card title="What to wear">
        <p>{match.kits.says}</p>
        {worn && worn.comparison.says !== '' && <p className="text-dusk mt-1">{worn.comparison.says}</p>}
        <p className="type-fine text-dusk mt-2">
          Both home kits side by side: ΔE {Math.round(match.asListed.deltaE)}, {match.asListed.verdict}. Below
          20 is a clash, below 30 is close (common practice). A screen shows colours only roughly: look at the
          shirts before the match.
        </p>
      </Card>
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <Side side={match.home} rules={match.rules} />
        <Side side={match.away} rules={match.rules} />
      </div>
    </div>
  );
}

function Half({
  side,
  kit,
  wears,
  end = false,
}: {
  side: MatchSide;
  kit: Kit;
  wears: string;
  end?: boolean;
}) {
  // The team's own colours; the words on them take ink or white, whichever reads better.
  const style: CSSProperties = { backgroundColor: kit.body, color: pickReadableInk(kit.body) };
  return (
    <div style={style} className={joinClasses('true-colour min-w-0 px-4 py-4', end && 'text-right')}>
      <h2 className="type-section break-words">{side.name}</h2>
      <p>
        {wears}, {kit.name}
      </p>
    </div>
  );
}

function Side({ side, rules }: { side: MatchSide; rules: string | null }) {
  return (
    <Card
      title={
        <span className="flex items-center gap-2">
          <YokeTile kit={side.kits.home} size="xs" />
          <span className="min-w-0 break-words">{side.name}</span>
        </span>
      }
      aside={`${side.players.length} listed, roster ${side.state}`}
    >
      {side.players.length === 0 ? (
        <p className="text-dusk">No roster yet. Ask the team for its list before the match.</p>
      ) : (
        <ul className="grid grid-cols-[repeat(auto-fill,minmax(5.75rem,1fr))] gap-1.5">
          {side.players.map((player, index) => (
            <li
              key={index}
              className={joinClasses(
                'rounded-control true-colour min-w-0 border px-2 py-1.5 text-center',
                player.trouble ? 'border-stop bg-stop-wash text-stop' : 'border-hem bg-card',
              )}
            >
              <span className="type-jersey block text-3xl leading-none">{player.number || '?'}</span>
              {player.trouble && <span className="sr-only">to put right, </span>}
              <bdi className="type-fine text-dusk block truncate" title={player.name}>
                {player.name}
              </bdi>
            </li>
          ))}
        </ul>
      )}
      {side.troubles.length > 0 && (
        <div className="mt-3">
          <Notice tone="stop" title="Before play">
            <ul className="grid gap-1">
              {side.troubles.map((message) => (
                <li key={message}>{message}</li>
              ))}
            </ul>
          </Notice>
        </div>
      )}
      <p className="type-fine text-dusk mt-3">
        {rules === null ? 'No number rules in force for this division.' : `Checked against “${rules}”.`}{' '}
        {side.legibility.says}
      </p>
    </Card>
  );
}
