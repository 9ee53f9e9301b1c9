import { ButtonLink } from '@/components/ui/button';
import { TextLink } from '@/components/ui/text-link';
import { YokeTile } from '@/components/yoke-tile/yoke-tile';
import { paths } from '@/lib/web/paths';
import { BundlePicture } from './_components/bundle-picture';
import { pictureKits } from './_components/picture-roster';
import { RailPicture } from './_components/rail-picture';
import { RosterPicture } from './_components/roster-picture';
import { StepCard } from './_components/step-card';

export const metadata = { title: { absolute: 'Raglan: one kit plan for a whole league' } };

export default function LandingPage() {
  return (
    <>
      <section className="grid items-center gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,1fr)_auto]">
        <div className="max-w-150">
          <h1 className="text-[clamp(1.75rem,1.2rem+2vw,2.5rem)] leading-[1.08] font-[640] text-balance [font-stretch:112%]">
            One kit plan for a whole league
          </h1>
          <p className="type-lead mt-3">
            Dozens of teams, hundreds of players, one delivery. Raglan checks each roster against the
            division’s number rules as it is typed, keeps the numbers apart, and hands the decorator a bundle
            that can be pressed, bagged and shipped without a phone call.
          </p>
          <div className="mt-5 flex flex-wrap items-center gap-3">
            <ButtonLink href={paths.check()} look="primary" size="lg">
              Check a roster now
            </ButtonLink>
            <ButtonLink href={paths.signIn()} size="lg">
              Sign in
            </ButtonLink>
          </div>
          <p className="text-dusk mt-3">
            The check needs no account and keeps nothing. Run a league?{' '}
            <TextLink href={paths.signUp()}>Start one here</TextLink>.
          </p>
        </div>
        <ul aria-hidden="true" className="grid w-fit grid-cols-4 gap-x-5 gap-y-4 max-lg:hidden">
          {pictureKits.map(({ kit, number }) => (
            <li key={number}>
              <YokeTile kit={kit} number={number} size="xl" />
            </li>
          ))}
        </ul>
      </section>

      <h2 className="sr-only">How it goes</h2>
      <div className="mt-7 grid gap-4 lg:grid-cols-3">
        <StepCard step={1} title="Rosters are checked as typed" picture={<RosterPicture />}>
          Upload, paste or type. Every mistake stands beside its cell, with what would put it right.
        </StepCard>
        <StepCard step={2} title="Numbers are picked from a rail" picture={<RailPicture />}>
          Each number a team may wear, in one view: what is free, what is worn, and why not.
        </StepCard>
        <StepCard step={3} title="The decorator gets one bundle" picture={<BundlePicture />}>
          Signed-off teams become a batch that no longer changes, and everything needed to make it.
        </StepCard>
      </div>
    </>
  );
}
