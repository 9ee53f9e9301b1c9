'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormFailure } from '@/app/_components/form-failure';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { SelectField, TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { TextLink } from '@/components/ui/text-link';
import { useToast } from '@/components/ui/toast';
import { makeUniqueSlug } from '@/lib/domain/league/slug';
import type { Garment } from '@/lib/domain/roster/player';
import { applyDivisionLimits } from '@/lib/domain/rules/apply-division-limits';
import { describeRuleSet } from '@/lib/domain/rules/describe-rule-set';
import type { RuleSet } from '@/lib/domain/rules/rule-set';
import { countOf } from '@/lib/domain/text/count-of';
import type { DivisionInput } from '@/lib/use-cases/divisions/division-schemas';
import type { ActionResult, LeagueAction } from '@/lib/web/action-result';
import { paths } from '@/lib/web/paths';
import { GarmentsEditor } from './garments-editor';

export type DivisionValues = {
  name: string;
  ageBand: string;
  level: string;
  ruleSetId: string;
  leastPlayers: string;
  mostPlayers: string;
  freezesAt: string;
  garments: Garment[];
};

type RuleChoice = { id: string; name: string; rules: RuleSet | null };

type Props = {
  league: string;
  season: string;
  ruleSets: RuleChoice[];
  /** When rosters freeze where the division has no freeze of its own. */
  seasonFreezes: string;
  division: { id: string; name: string; rowVersion: number; teams: number } | null;
  start: DivisionValues;
  onAdd: LeagueAction<{ season: string; fields: DivisionInput }, { slug: string }> | null;
  onChange: LeagueAction<
    { divisionId: string; rowVersion: number; fields: DivisionInput },
    { rowVersion: number }
  > | null;
  onRemove: LeagueAction<{ divisionId: string }, { name: string }> | null;
};

const toCount = (text: string): number => (/^\d+$/.test(text.trim()) ? Number(text) : Number.NaN);

/**
 * A new garment gets its short name from what it is called when it is first saved; rosters know it by that ever after,
 * so one that was `saved` keeps its own whatever it is called now.
 */
function nameGarments(garments: readonly Garment[], saved: readonly Garment[]): Garment[] {
  const kept = new Set(saved.map((garment) => garment.code));
  const taken = new Set([...kept, ...garments.map((garment) => garment.code)]);
  return garments.map((garment) => {
    if (kept.has(garment.code) || !/^new-\d+$/.test(garment.code) || garment.name.trim() === '')
      return garment;
    const code = makeUniqueSlug(garment.name.slice(0, 30), 'garment', taken);
    if (!/^[a-z]/.test(code)) return garment;
    taken.add(code);
    return { ...garment, code };
  });
}

/** Everything a division is: name, limits, rules, freeze and garments. Entries stay on every failure. */
export function DivisionForm({
  league,
  season,
  ruleSets,
  seasonFreezes,
  division,
  start,
  onAdd,
  onChange,
  onRemove,
}: Props) {
  const router = useRouter();
  const showToast = useToast();
  const [values, setValues] = useState(start);
  const list = paths.divisions(league, season);
  const send = async (): Promise<ActionResult<unknown>> => {
    const fields = {
      ...values,
      garments: nameGarments(values.garments, division ? start.garments : []),
      leastPlayers: toCount(values.leastPlayers),
      mostPlayers: toCount(values.mostPlayers),
      freezesAt: values.freezesAt === '' ? null : values.freezesAt,
    };
    if (division && onChange)
      return onChange(league, { divisionId: division.id, rowVersion: division.rowVersion, fields });
    if (onAdd) return onAdd(league, { season, fields });
    throw new Error('nothing to send the form to');
  };
  const {
    submit,
    pending,
    failure,
    fields: errors,
  } = useSubmit(send, () => {
    showToast({ tone: 'set', title: `${values.name} is ${division ? 'saved' : 'added'}` });
    router.push(list);
    router.refresh();
    return 'leaving';
  });
  const bind = (name: Exclude<keyof DivisionValues, 'garments'>) => ({
    name,
    value: values[name],
    onChange: (event: { target: { value: string } }) => setValues({ ...values, [name]: event.target.value }),
    error: errors[`fields.${name}`],
  });
  const remove = async () => {
    if (!division || !onRemove) return;
    const answer = await onRemove(league, { divisionId: division.id });
    if (!answer.ok) return answer.error.message;
    showToast({ tone: 'set', title: `${answer.data.name} is removed` });
    router.push(list);
    router.refresh();
  };

  return (
    <form
      noValidate
      className="grid gap-5"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <Card title="Who plays">
        <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-3">
          <TextField label="Name" required maxLength={80} {...bind('name')} />
          <TextField
            label="Age band"
            required={false}
            maxLength={40}
            {...bind('ageBand')}
            hint="Such as under 12."
          />
          <TextField label="Level" required={false} maxLength={40} {...bind('level')} />
          <TextField label="Least players" inputMode="numeric" required {...bind('leastPlayers')} />
          <TextField label="Most players" inputMode="numeric" required {...bind('mostPlayers')} />
          <TextField
            label="Own freeze"
            type="datetime-local"
            required={false}
            {...bind('freezesAt')}
            hint={`Empty: with the season, ${seasonFreezes}.`}
          />
        </div>
      </Card>
      <Card title="Number rules">
        {ruleSets.length === 0 ? (
          <Notice tone="care" title="No rule set yet">
            <TextLink href={`${paths.numberRules(league)}/new`}>Start one from a published code</TextLink>,
            then come back.
          </Notice>
        ) : (
          <div className="grid gap-x-8 gap-y-4 lg:grid-cols-[minmax(0,1fr)_minmax(0,2fr)]">
            <SelectField
              label="Plays by"
              required
              placeholder="Pick a rule set"
              options={ruleSets.map((ruleSet) => ({ value: ruleSet.id, label: ruleSet.name }))}
              {...bind('ruleSetId')}
            />
            <RulesInWords
              league={league}
              choice={ruleSets.find((ruleSet) => ruleSet.id === values.ruleSetId)}
              limits={{
                leastPlayers: toCount(values.leastPlayers) || 0,
                mostPlayers: toCount(values.mostPlayers) || 0,
              }}
            />
          </div>
        )}
      </Card>
      <GarmentsEditor
        garments={values.garments}
        errors={errors}
        onChange={(garments) => setValues((now) => ({ ...now, garments }))}
      />
      <FormFailure failure={failure} />
      <div className="flex flex-wrap gap-2">
        <Button type="submit" look="primary" pending={pending}>
          {division ? 'Save the division' : 'Add the division'}
        </Button>
        {division && onRemove && (
          <ConfirmDialog
            title={`Remove ${division.name}?`}
            confirm={`Remove ${division.name}`}
            onConfirm={remove}
            trigger={
              <Button
                look="danger"
                unavailable={
                  division.teams > 0
                    ? `It has ${countOf(division.teams, 'team')}. Move or remove ${division.teams === 1 ? 'it' : 'them'} first.`
                    : undefined
                }
              >
                Remove
              </Button>
            }
          >
            Its limits and garments are lost. The number rules stay.
          </ConfirmDialog>
        )}
      </div>
    </form>
  );
}

/** What the chosen rules say of a roster of this division, with the limits as typed. */
function RulesInWords({
  league,
  choice,
  limits,
}: {
  league: string;
  choice: RuleChoice | undefined;
  limits: { leastPlayers: number; mostPlayers: number };
}) {
  if (!choice)
    return <p className="text-dusk self-center">What they say stands here once they are chosen.</p>;
  if (choice.rules === null) {
    return (
      <Notice tone="care" title={`${choice.name} is not in force yet`}>
        Rosters are not checked until{' '}
        <TextLink href={paths.numberRuleSet(league, choice.id)}>a version of it is in force</TextLink>.
      </Notice>
    );
  }
  return (
    <ul className="list-disc pl-5" aria-label={`What ${choice.name} says`}>
      {describeRuleSet(applyDivisionLimits(choice.rules, limits)).map((sentence) => (
        <li key={sentence}>{sentence}</li>
      ))}
    </ul>
  );
}
