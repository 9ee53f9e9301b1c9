'use client';

import { useWritten } from '@/app/_components/use-written';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Checkbox } from '@/components/ui/checkbox';
import { FieldError, SelectField, TextareaField, TextField } from '@/components/ui/field';
import { IconButton } from '@/components/ui/icon-button';
import { Menu } from '@/components/ui/menu';
import { useToast } from '@/components/ui/toast';
import { starterKits } from '@/lib/domain/kit/starter-kits';
import type { Garment } from '@/lib/domain/roster/player';
import { countOf } from '@/lib/domain/text/count-of';

const worn = [
  { value: 'home', label: 'with the home kit' },
  { value: 'away', label: 'with the away kit' },
  { value: 'home and away', label: 'one for each kit' },
];

/** `YS = Youth small, YM, AS`: codes with commas, each with its words behind an equals sign if it has any. */
const writeSizes = (sizes: Garment['sizes']): string =>
  sizes.map(({ code, label }) => (label === code ? code : `${code} = ${label}`)).join(', ');

/** The reverse; what stands between two commas and has no code is left out. */
const readSizes = (text: string): Garment['sizes'] =>
  text
    .split(',')
    .map((part) => part.split('=').map((side) => side.trim()))
    .filter(([code]) => code !== undefined && code !== '')
    .map(([code = '', label]) => ({ code, label: label === undefined || label === '' ? code : label }));

/** The garments of a division in the order they are packed: name, kit, what is printed, and the sizes on offer. */
export function GarmentsEditor({
  garments,
  errors,
  onChange,
}: {
  garments: readonly Garment[];
  errors: Record<string, string>;
  onChange: (garments: Garment[]) => void;
}) {
  const showToast = useToast();
  const set = (index: number, part: Partial<Garment>) =>
    onChange(garments.map((garment, at) => (at === index ? { ...garment, ...part } : garment)));
  const move = (index: number, by: number) => {
    const next = [...garments];
    const [moved] = next.splice(index, 1);
    if (moved) next.splice(index + by, 0, moved);
    onChange(next);
  };
  const add = () => {
    const taken = new Set(garments.map((garment) => garment.code));
    let n = garments.length + 1;
    while (taken.has(`new-${n}`)) n += 1;
    onChange([
      ...garments,
      {
        code: `new-${n}`,
        name: '',
        worn: 'home',
        numbered: false,
        named: false,
        sizes: [...(garments[0]?.sizes ?? [])],
      },
    ]);
  };
  const errorOf = (index: number, part: string): string | undefined =>
    Object.entries(errors).find(([path]) => path.startsWith(`fields.garments.${index}.${part}`))?.[1];

  return (
    <Card
      title="Garments"
      aside={
        <Menu
          align="end"
          trigger={
            <Button size="sm" look="quiet">
              Start from a usual kit
            </Button>
          }
          groups={[
            {
              items: starterKits.map((kit) => ({
                label: kit.name,
                hint: kit.says,
                onSelect: () => {
                  onChange([...kit.garments]);
                  showToast({
                    tone: 'set',
                    title: `${kit.name}: ${countOf(kit.garments.length, 'garment')}, not saved yet`,
                    action: { label: 'Undo', onSelect: () => onChange([...garments]) },
                  });
                },
              })),
            },
          ]}
        />
      }
    >
      <div className="grid gap-4">
        {garments.map((garment, index) => (
          <fieldset key={garment.code} className="border-hem rounded-control grid gap-3 border p-3 sm:p-4">
            <legend className="sr-only">{garment.name || `Garment ${index + 1}`}</legend>
            <div className="grid items-start gap-3 sm:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_auto]">
              <TextField
                label="Garment"
                required
                maxLength={60}
                value={garment.name}
                error={errorOf(index, 'name') ?? errorOf(index, 'code')}
                onChange={(event) => set(index, { name: event.target.value })}
              />
              <SelectField
                label="Worn"
                options={worn}
                value={garment.worn}
                onChange={(event) => set(index, { worn: event.target.value as Garment['worn'] })}
              />
              <span className="flex sm:pt-6">
                <IconButton
                  icon="up"
                  label={`Move ${garment.name} up`}
                  disabled={index === 0}
                  onClick={() => move(index, -1)}
                />
                <IconButton
                  icon="down"
                  label={`Move ${garment.name} down`}
                  disabled={index === garments.length - 1}
                  onClick={() => move(index, 1)}
                />
                <IconButton
                  icon="close"
                  label={`Remove ${garment.name || 'this garment'}`}
                  onClick={() => onChange(garments.filter((_, at) => at !== index))}
                />
              </span>
            </div>
            <SizesField
              sizes={garment.sizes}
              error={errorOf(index, 'sizes')}
              onChange={(sizes) => set(index, { sizes })}
            />
            <div className="flex flex-wrap gap-x-6">
              <Checkbox
                label="Carries the number"
                checked={garment.numbered}
                onChange={(event) => set(index, { numbered: event.target.checked })}
              />
              <Checkbox
                label="Carries the name"
                checked={garment.named}
                onChange={(event) => set(index, { named: event.target.checked })}
              />
            </div>
          </fieldset>
        ))}
        {errors['fields.garments'] !== undefined && <FieldError>{errors['fields.garments']}</FieldError>}
        <div>
          <Button size="sm" onClick={add}>
            Add a garment
          </Button>
        </div>
      </div>
    </Card>
  );
}

/** The sizes as one line of text, which stays as typed while it says the same sizes. */
function SizesField({
  sizes,
  error,
  onChange,
}: {
  sizes: Garment['sizes'];
  error: string | undefined;
  onChange: (sizes: Garment['sizes']) => void;
}) {
  const written = useWritten(sizes, { read: readSizes, write: writeSizes }, onChange);
  return (
    <TextareaField
      rows={2}
      label="Sizes, smallest first"
      required
      value={written.value}
      error={error}
      hint={`${countOf(sizes.length, 'size')}. Codes with commas; words behind an equals sign: YS = Youth small, YM = Youth medium.`}
      onChange={(event) => written.type(event.target.value)}
    />
  );
}
