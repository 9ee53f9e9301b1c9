import type { ReactNode } from 'react';
import { BatchSteps } from '@/components/batch/batch-steps';
import { BundleFiles } from '@/components/batch/bundle-files';
import { BundlePanel } from '@/components/batch/bundle-panel';
import { DigitPulls } from '@/components/batch/digit-pulls';
import { GarmentPulls } from '@/components/batch/garment-pulls';
import { DownloadLink } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { EmptyState } from '@/components/ui/empty-state';
import { KeyFigures } from '@/components/ui/key-figures';
import { Notice } from '@/components/ui/notice';
import { PageHeader } from '@/components/ui/page-header';
import { StateTrack } from '@/components/ui/state-track';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import { batchStates, type BatchState } from '@/lib/domain/batch/batch-state';
import type { BundleProgress } from '@/lib/domain/batch/bundle-progress';
import { formatDay, formatShortInstant } from '@/lib/domain/dates/format';
import type { Kit } from '@/lib/domain/kit/kit';
import type { LeagueSummary } from '@/lib/domain/league/league';
import type { DigitPull } from '@/lib/domain/packing/pull-digits';
import type { GarmentPull } from '@/lib/domain/packing/pull-garments';
import { countOf } from '@/lib/domain/text/count-of';
import { formatBytes } from '@/lib/domain/text/format-bytes';
import { paths } from '@/lib/web/paths';

type Detail = {
  batch: { id: string; code: string; state: BatchState; shop: { name: string }; promisedOn: string | null };
  heldTeams: { id: string; name: string; state: string }[];
  events: { state: BatchState; at: Date; note: string; by: string | null }[];
  contents: {
    teams: { id: string; name: string; division: string; kit: Kit; players: number }[];
    players: number;
    pieces: number;
    garments: GarmentPull[];
    digits: DigitPull[];
  } | null;
  snapshotSha256: string | null;
  bundle: BundleProgress | null;
  parts: { path: string; label: string; bytes: number }[];
  may: { change: boolean; mark: boolean; receive: boolean };
};
type Answer = { ok: true } | { ok: false; error: { message: string } };
type Marked = Exclude<BatchState, 'held'>;

/**
 * A batch as the league and the shop see it: where it stands, what to pull, and its bundle. Props: `detail`, `league`,
 * `back`, `heldActions` for a batch that can still change, `onMark` and `onRebuild` bound to the league.
 */
export function BatchDetailView({
  detail,
  league,
  back,
  heldActions,
  onMark,
  onRebuild,
}: {
  detail: Detail;
  league: LeagueSummary;
  back: ReactNode;
  heldActions: ReactNode;
  onMark: (input: { batchId: string; from: Marked; to: Marked; note: string }) => Promise<Answer>;
  onRebuild: (input: { batchId: string }) => Promise<Answer>;
}) {
  const { batch, contents, bundle } = detail;
  const teams = contents?.teams.length ?? detail.heldTeams.length;
  const promised = batch.promisedOn === null ? '' : `, promised for ${formatDay(batch.promisedOn)}`;
  const said = Object.fromEntries(
    detail.events.map((event) => [event.state, formatShortInstant(event.at, league.timeZone)]),
  );
  const zip = paths.api.bundleZip(league.slug, batch.code);
  return (
    <>
      <PageHeader
        back={back}
        title={`Batch ${batch.code}`}
        subtitle={`${countOf(teams, 'team')} of ${league.name} for the ${batch.shop.name}${promised}`}
        actions={
          <>
            {heldActions}
            <BatchSteps batchId={batch.id} state={batch.state} may={detail.may} onMark={onMark} />
            {bundle?.state === 'ready' && (
              <DownloadLink look="primary" href={zip}>
                Download the bundle, {formatBytes(bundle.bytes ?? 0)}
              </DownloadLink>
            )}
          </>
        }
      />
      <Card flush className="mb-5">
        <div className="p-4">
          <StateTrack
            label="State of the batch"
            current={batch.state}
            steps={batchStates.map((state) => ({ id: state, label: state, note: said[state] }))}
          />
        </div>
        {contents && (
          <div className="border-hem border-t">
            <KeyFigures
              figures={[
                { label: 'Teams', value: contents.teams.length },
                { label: 'Players', value: contents.players },
                { label: 'Garments', value: contents.pieces },
                {
                  label: 'Digits to apply',
                  value: contents.digits.reduce((sum, pull) => sum + pull.total, 0),
                },
              ]}
            />
          </div>
        )}
      </Card>
      <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,1fr)_24rem]">
        <div className="grid gap-5">
          {contents ? (
            <>
              <GarmentPulls pulls={contents.garments} />
              <DigitPulls pulls={contents.digits} />
              <Notice tone="care" title="Before anything is pressed">
                The maker’s sheet for the film or transfer in your hand comes first. Press one sample and let
                it cool before the run. Platens burn and crush: trained hands only.
              </Notice>
            </>
          ) : (
            <HeldTeams teams={detail.heldTeams} />
          )}
        </div>
        {contents && (
          <div className="grid gap-5">
            <Card
              flush
              title="In the bundle"
              aside={bundle?.state === 'ready' ? countOf(detail.parts.length, 'file') : undefined}
            >
              {bundle && bundle.state !== 'ready' && (
                <BundlePanel
                  stateUrl={paths.api.bundleState(league.slug, batch.code)}
                  initial={bundle}
                  batchId={batch.id}
                  onRetry={onRebuild}
                />
              )}
              {bundle?.state === 'ready' && (
                <BundleFiles
                  files={detail.parts.map((part) => ({
                    ...part,
                    href: paths.api.bundleFile(league.slug, batch.code, part.path),
                  }))}
                />
              )}
            </Card>
            <Card flush title="Teams" aside={countOf(contents.players, 'player')}>
              <ul>
                {contents.teams.map((team) => (
                  <li key={team.id} className="border-hem flex items-center gap-3 border-t px-4 py-2">
                    <YokeTile kit={team.kit} size="xs" />
                    <span className="min-w-0 grow">
                      <span className="block font-[560] break-words">{team.name}</span>
                      <span className="type-fine text-dusk">{team.division}</span>
                    </span>
                    <span className="text-dusk">{team.players}</span>
                  </li>
                ))}
              </ul>
            </Card>
            {detail.snapshotSha256 !== null && (
              <p className="type-fine text-dusk break-all">
                Contents, SHA-256: <span className="font-mono">{detail.snapshotSha256}</span>
              </p>
            )}
          </div>
        )}
      </div>
    </>
  );
}

function HeldTeams({ teams }: { teams: Detail['heldTeams'] }) {
  return (
    <Card flush title="Teams" aside="held until you release it">
      {teams.length === 0 ? (
        <EmptyState title="No teams in this batch">Change its teams, or discard it.</EmptyState>
      ) : (
        <ul>
          {teams.map((team) => (
            <li key={team.id} className="border-hem flex justify-between gap-3 border-t px-4 py-2.5">
              <span className="min-w-0 font-[560] break-words">{team.name}</span>
              <span className="text-dusk shrink-0">{team.state}</span>
            </li>
          ))}
        </ul>
      )}
    </Card>
  );
}
