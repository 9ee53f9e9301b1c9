'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { foldForSearch, holdsEveryWord } from '@/components/ui/fold-for-search';
import { Field } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { SearchInput } from '@/components/ui/search-input';
import { Tag } from '@/components/ui/tag';
import { TextInput } from '@/components/ui/text-input';
import type { PresetCitation } from '@/lib/domain/rules/catalogue/catalogue-preset';
import { sayHowKnown, writeCitation } from '@/lib/domain/rules/write-citation';
import type { LeagueAction } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';

type Preset = {
  id: string;
  sport: string;
  title: string;
  summary: string;
  citations: PresetCitation[];
  open: string[];
  checkYourBook: string;
  sentences: string[];
};
type Start = LeagueAction<{ name: string; sport: string; presetId: string | null }, { ruleSetId: string }>;

const ownRules = 'own';

/** Picks a code from the catalogue, shows what it says and where that comes from, and starts a draft from it. */
export function StartRuleSetForm({
  league,
  presets,
  onStart,
}: {
  league: string;
  presets: Preset[];
  onStart: Start;
}) {
  const router = useRouter();
  const [find, setFind] = useState('');
  const [chosen, setChosen] = useState(presets[0]?.id ?? ownRules);
  const [name, setName] = useState<string>();
  const [sport, setSport] = useState('');
  const preset = presets.find((entry) => entry.id === chosen);
  const shown = presets.filter((entry) =>
    holdsEveryWord(foldForSearch(`${entry.sport} ${entry.title} ${entry.summary}`), find),
  );
  const givenName = name ?? preset?.title ?? '';

  const { submit, pending, failure, fields } = useSubmit(
    () =>
      onStart(league, {
        name: givenName,
        sport: preset?.sport ?? sport,
        presetId: preset?.id ?? null,
      }),
    ({ ruleSetId }) => {
      router.push(`${paths.numberRuleSet(league, ruleSetId)}/edit`);
      return 'leaving';
    },
  );

  return (
    <form
      className="grid items-start gap-5 lg:grid-cols-[20rem_minmax(0,1fr)]"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <Card flush title="Catalogue">
        <div className="px-4 pb-3">
          <SearchInput
            label="Find a sport or body"
            value={find}
            onChange={(event) => setFind(event.target.value)}
            className="sm:w-full"
          />
        </div>
        <fieldset>
          <legend className="sr-only">Start from</legend>
          {[...shown, null].map((entry) => (
            <label
              key={entry?.id ?? ownRules}
              className="border-hem has-checked:bg-damson-wash focus-within:outline-damson block cursor-pointer border-t px-4 py-2.5 focus-within:outline-2 focus-within:-outline-offset-2"
            >
              <input
                type="radio"
                name="preset"
                className="sr-only"
                checked={chosen === (entry?.id ?? ownRules)}
                onChange={() => setChosen(entry?.id ?? ownRules)}
              />
              <span className="block font-[560]">{entry?.title ?? 'Rules of your own'}</span>
              <span className="type-small text-dusk">
                {entry?.sport ?? 'any number to 99, then as you decide'}
              </span>
            </label>
          ))}
        </fieldset>
      </Card>
      <div className="grid gap-5">
        <Card title={preset?.title ?? 'Rules of your own'}>
          <p>
            {preset?.summary ??
              'You decide every rule. Nothing is cited, and referees see that it is the league’s own.'}
          </p>
          {preset && (
            <ul className="mt-3 list-disc pl-5">
              {preset.sentences.map((sentence) => (
                <li key={sentence}>{sentence}</li>
              ))}
            </ul>
          )}
        </Card>
        {preset && <Citations preset={preset} />}
        <Card title="Start it">
          <div className="grid gap-4 sm:max-w-120">
            <Field label="Name in your league" required error={fields['name']}>
              {(wiring) => (
                <TextInput
                  {...wiring}
                  value={givenName}
                  maxLength={80}
                  onChange={(event) => setName(event.target.value)}
                />
              )}
            </Field>
            {!preset && (
              <Field label="Sport" required error={fields['sport']}>
                {(wiring) => (
                  <TextInput
                    {...wiring}
                    value={sport}
                    maxLength={60}
                    onChange={(event) => setSport(event.target.value)}
                  />
                )}
              </Field>
            )}
            {failure !== undefined && (
              <Notice tone="stop" live="assertive">
                {failure.message}
              </Notice>
            )}
            <div>
              <Button type="submit" look="primary" pending={pending}>
                Start a draft
              </Button>
            </div>
          </div>
        </Card>
      </div>
    </form>
  );
}

function Citations({ preset }: { preset: Preset }) {
  return (
    <Card title="Where it comes from">
      <ul className="grid gap-3">
        {preset.citations.map((citation) => (
          <li key={`${citation.document} ${citation.rule} ${citation.says}`} className="grid gap-0.5">
            <span>
              {citation.says} <Tag>{sayHowKnown(citation.known)}</Tag>
            </span>
            <span className="type-small text-dusk">{writeCitation(citation)}</span>
          </li>
        ))}
      </ul>
      {preset.open.length > 0 && (
        <>
          <h3 className="type-label mt-4">Left to your league</h3>
          <ul className="text-dusk mt-1 list-disc pl-5">
            {preset.open.map((entry) => (
              <li key={entry}>{entry}</li>
            ))}
          </ul>
        </>
      )}
      <p className="text-dusk mt-4">{preset.checkYourBook}</p>
    </Card>
  );
}
