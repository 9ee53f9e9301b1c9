'use client';

import { useRouter } from 'next/navigation';
import { useState, type ReactNode } from 'react';
import { NumberRail } from '@/components/number-rail/number-rail';
import { useSubmit } from '@/app/_components/use-submit';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Checkbox } from '@/components/ui/checkbox';
import { Field } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { Select } from '@/components/ui/select';
import { TextInput } from '@/components/ui/text-input';
import { useToast } from '@/components/ui/toast';
import { buildNumberRail } from '@/lib/domain/numbers/number-rail';
import { describeRuleSet } from '@/lib/domain/rules/describe-rule-set';
import { listRuleSetProblems } from '@/lib/domain/rules/list-rule-set-problems';
import type { RuleSet, RuleWeight } from '@/lib/domain/rules/rule-set';
import type { LeagueAction } from '@/lib/web/action-result';
import { ReservedEditor } from './reserved-editor';
import { RequiredRolesEditor } from './required-roles-editor';

type Save = LeagueAction<
  { ruleSetId: string; rowVersion: number | null; ruleSet: RuleSet },
  { rowVersion: number; version: number }
>;

const weights = [
  { value: 'blocker', label: 'blocks the roster' },
  { value: 'caution', label: 'only cautions' },
  { value: 'off', label: 'is not checked' },
];

const toCount = (text: string, fallback: number): number =>
  /^\d{1,3}$/.test(text) ? Number(text) : fallback;

/** Every rule of a draft as a form, with the number rail and the sentences that follow from it at the side. */
export function RuleSetForm({
  league,
  ruleSetId,
  start,
  rowVersion: startVersion,
  path,
  onSave,
}: {
  league: string;
  ruleSetId: string;
  start: RuleSet;
  rowVersion: number | null;
  path: string;
  onSave: Save;
}) {
  const router = useRouter();
  const showToast = useToast();
  const [rules, setRules] = useState(start);
  const [rowVersion, setRowVersion] = useState(startVersion);
  const problems = listRuleSetProblems(rules);
  const problemOf = (part: 'labels' | 'reserved' | 'roster') =>
    problems.find((problem) => problem.part === part)?.message;
  const change = <K extends keyof RuleSet>(part: K, value: Partial<RuleSet[K]>) =>
    setRules({ ...rules, [part]: { ...(rules[part] as object), ...value } });

  const { submit, pending, failure, fields } = useSubmit(
    () => onSave(league, { ruleSetId, rowVersion, ruleSet: rules }),
    (saved) => {
      setRowVersion(saved.rowVersion);
      showToast({ tone: 'set', title: `Draft ${saved.version} is saved; it is not in force yet` });
      router.push(`${path}?version=${saved.version}`);
      router.refresh();
      return 'leaving';
    },
  );

  return (
    <form
      className="grid items-start gap-5 xl:grid-cols-[minmax(0,1fr)_24rem]"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <div className="grid gap-5">
        <Part title="Numbers" weight={rules.labels.weight} onWeigh={(weight) => change('labels', { weight })}>
          <Field
            label="Allowed numbers"
            hint="Ranges and single numbers with commas, such as 0, 00, 1–5, 10–15. 0 and 00 are two numbers."
            error={problemOf('labels')}
            className="sm:col-span-2"
          >
            {(wiring) => (
              <TextInput
                {...wiring}
                value={rules.labels.allowed}
                maxLength={400}
                onChange={(event) => change('labels', { allowed: event.target.value })}
              />
            )}
          </Field>
          <Field
            label="Digits allowed"
            hint="Empty for all ten."
            required={false}
            error={fields['ruleSet.labels.digits']}
          >
            {(wiring) => (
              <TextInput
                {...wiring}
                inputMode="numeric"
                value={rules.labels.digits ?? ''}
                maxLength={10}
                onChange={(event) =>
                  change('labels', { digits: event.target.value.replace(/\D/g, '') || null })
                }
              />
            )}
          </Field>
          <Field label="Why these digits" required={false}>
            {(wiring) => (
              <TextInput
                {...wiring}
                value={rules.labels.digitsReason}
                maxLength={200}
                onChange={(event) => change('labels', { digitsReason: event.target.value })}
              />
            )}
          </Field>
          <Choice
            label="Most digits"
            value={String(rules.labels.mostDigits)}
            options={['1', '2', '3']}
            onChange={(value) => change('labels', { mostDigits: Number(value) })}
          />
          <Choice
            label="A leading zero, as in 07"
            value={rules.labels.leadingZeros}
            options={['refused', 'same as without', 'allowed']}
            onChange={(value) =>
              change('labels', { leadingZeros: value as RuleSet['labels']['leadingZeros'] })
            }
          />
          <Choice
            label="0 and 00"
            value={rules.labels.zeroAndDoubleZero}
            options={['both and different', 'not both', 'one value', 'neither']}
            onChange={(value) =>
              change('labels', { zeroAndDoubleZero: value as RuleSet['labels']['zeroAndDoubleZero'] })
            }
          />
        </Part>
        <Part
          title="Two players with one number"
          weight={rules.uniqueness.weight}
          onWeigh={(weight) => change('uniqueness', { weight })}
        >
          <Choice
            label="A number is worn once"
            value={rules.uniqueness.within}
            options={['team', 'none']}
            labels={{ team: 'in each team', none: 'no: it may be shared' }}
            onChange={(value) => change('uniqueness', { within: value as RuleSet['uniqueness']['within'] })}
          />
        </Part>
        <Part
          title="Numbers set aside"
          weight={rules.reservedWeight}
          onWeigh={(reservedWeight) => setRules({ ...rules, reservedWeight })}
        >
          <ReservedEditor
            reserved={rules.reserved}
            error={problemOf('reserved')}
            onChange={(reserved) => setRules({ ...rules, reserved })}
          />
        </Part>
        <Part title="Roster" weight={rules.roster.weight} onWeigh={(weight) => change('roster', { weight })}>
          <p className="text-dusk sm:col-span-2">
            Least and most players are set in each division; these stand where a division sets none.
          </p>
          <Field label="Least players" error={problemOf('roster')}>
            {(wiring) => (
              <TextInput
                {...wiring}
                type="number"
                min={0}
                max={200}
                value={rules.roster.least}
                onChange={(event) => change('roster', { least: toCount(event.target.value, 0) })}
              />
            )}
          </Field>
          <Field label="Most players">
            {(wiring) => (
              <TextInput
                {...wiring}
                type="number"
                min={1}
                max={200}
                value={rules.roster.most}
                onChange={(event) => change('roster', { most: toCount(event.target.value, 1) })}
              />
            )}
          </Field>
          <RequiredRolesEditor
            roles={rules.roster.requiredRoles}
            onChange={(requiredRoles) => change('roster', { requiredRoles })}
          />
        </Part>
        <Part
          title="Names on the back"
          weight={rules.names.weight}
          onWeigh={(weight) => change('names', { weight })}
        >
          <Choice
            label="A name on the back is"
            value={rules.names.onBack}
            options={['wanted', 'allowed', 'not allowed']}
            onChange={(value) => change('names', { onBack: value as RuleSet['names']['onBack'] })}
          />
          <Field label="Most letters">
            {(wiring) => (
              <TextInput
                {...wiring}
                type="number"
                min={1}
                max={40}
                value={rules.names.mostLetters}
                onChange={(event) =>
                  change('names', { mostLetters: Math.min(40, Math.max(1, toCount(event.target.value, 1))) })
                }
              />
            )}
          </Field>
          <Choice
            label="Letters"
            value={rules.names.letters}
            options={['any', 'latin']}
            labels={{ any: 'of any script', latin: 'Latin only' }}
            onChange={(value) => change('names', { letters: value as RuleSet['names']['letters'] })}
          />
          <Checkbox
            label="Two of one surname need an initial"
            checked={rules.names.sharedSurnameNeedsInitial}
            onChange={(event) => change('names', { sharedSurnameNeedsInitial: event.target.checked })}
            className="self-end"
          />
          <p className="text-dusk type-small sm:col-span-2">
            Names of minors on shirts are public. Print them only where the family has agreed, and follow your
            local rules.
          </p>
        </Part>
        <Part title="Sizes" weight={rules.sizes.weight} onWeigh={(weight) => change('sizes', { weight })}>
          <p className="text-dusk sm:col-span-2">
            Every garment needs one of the sizes that its division offers.
          </p>
        </Part>
      </div>
      <div className="grid gap-5 xl:sticky xl:top-5">
        <Card title="Number rail">
          {problemOf('labels') ? (
            <p className="text-dusk">The rail appears when the allowed numbers can be read.</p>
          ) : (
            <NumberRail labels={buildNumberRail(rules, [])} />
          )}
        </Card>
        <Card title="What it says now">
          <ul className="list-disc pl-5">
            {describeRuleSet(rules).map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
        </Card>
        {failure !== undefined && (
          <Notice tone="stop" live="assertive">
            {failure.message}
          </Notice>
        )}
        <Button type="submit" look="primary" pending={pending} unavailable={problems[0]?.message}>
          Save the draft
        </Button>
      </div>
    </form>
  );
}

function Part({
  title,
  weight,
  onWeigh,
  children,
}: {
  title: string;
  weight: RuleWeight;
  onWeigh: (weight: RuleWeight) => void;
  children: ReactNode;
}) {
  return (
    <Card
      title={title}
      aside={
        <label className="flex items-center gap-2">
          <span>What breaks this</span>
          <Select
            options={weights}
            value={weight}
            onChange={(event) => onWeigh(event.target.value as RuleWeight)}
            className="w-44"
          />
        </label>
      }
    >
      <div className="grid items-start gap-4 sm:grid-cols-2">{children}</div>
    </Card>
  );
}

function Choice({
  label,
  value,
  options,
  labels = {},
  onChange,
}: {
  label: string;
  value: string;
  options: readonly string[];
  labels?: Record<string, string>;
  onChange: (value: string) => void;
}) {
  return (
    <Field label={label}>
      {(wiring) => (
        <Select
          {...wiring}
          value={value}
          options={options.map((option) => ({ value: option, label: labels[option] ?? option }))}
          onChange={(event) => onChange(event.target.value)}
        />
      )}
    </Field>
  );
}
