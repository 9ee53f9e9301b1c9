import { Card } from '@/components/ui/card';
import { SelectField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import type { ColumnMapping, ColumnTarget } from '@/lib/domain/roster/import/column-mapping';
import { listHeadings } from '@/lib/domain/roster/import/find-headings';
import type { Garment } from '@/lib/domain/roster/player';
import type { Source } from './source';

const fixed: { value: string; label: string }[] = [
  { value: 'name', label: 'Name' },
  { value: 'firstName', label: 'First name' },
  { value: 'lastName', label: 'Last name' },
  { value: 'nameOnBack', label: 'Name on back' },
  { value: 'number', label: 'Number' },
  { value: 'role', label: 'Role' },
];

const valueOf = (target: ColumnTarget): string =>
  target.field === 'size' ? `size:${target.garments.join('+')}` : target.field;

function targetOf(value: string): ColumnTarget {
  if (value.startsWith('size:')) return { field: 'size', garments: value.slice(5).split('+') };
  return { field: value as Exclude<ColumnTarget['field'], 'size'> };
}

/** What each column holds: guessed or remembered, and changed here; which row has the headings, and which sheet. */
export function ColumnsCard({
  source,
  sheet,
  onSheet,
  rows,
  mapping,
  recalled,
  garments,
  onMapping,
}: {
  source: Source;
  sheet: number;
  onSheet: (index: number) => void;
  rows: readonly (readonly string[])[];
  mapping: ColumnMapping;
  recalled: boolean;
  garments: readonly Garment[];
  onMapping: (mapping: ColumnMapping) => void;
}) {
  const { headings } = listHeadings(rows, mapping.headerRow);
  const notes = source.sheets[sheet]?.notes ?? [];
  const sizes = [
    ...garments.map((garment) => ({ value: `size:${garment.code}`, label: `${garment.name} size` })),
    ...(garments.length > 1
      ? [{ value: `size:${garments.map((garment) => garment.code).join('+')}`, label: 'Size of everything' }]
      : []),
  ];
  const own = mapping.columns
    .map(valueOf)
    .filter((value) => value.startsWith('size:') && !sizes.some((size) => size.value === value));
  const options = [
    ...fixed,
    ...sizes,
    ...own.map((value) => ({ value, label: 'Several sizes' })),
    { value: 'extra', label: 'Keep it as it is' },
    { value: 'leave out', label: 'Leave it out' },
  ];
  return (
    <Card
      title="Columns"
      aside={recalled ? 'as you matched them last time' : 'our guess; change what is wrong'}
    >
      <div className="mb-4 grid gap-3 sm:grid-cols-2 lg:grid-cols-4">
        {source.sheets.length > 1 && (
          <SelectField
            label="Sheet"
            options={source.sheets.map((entry, index) => ({ value: String(index), label: entry.name }))}
            value={String(sheet)}
            onChange={(event) => onSheet(Number(event.target.value))}
          />
        )}
        <SelectField
          label="Headings"
          options={[
            { value: '', label: 'There are none' },
            ...rows.slice(0, 12).map((row, index) => ({
              value: String(index),
              label: `Row ${index + 1}: ${row.filter(Boolean).join(', ').slice(0, 50)}`,
            })),
          ]}
          value={mapping.headerRow === null ? '' : String(mapping.headerRow)}
          onChange={(event) =>
            onMapping({
              ...mapping,
              headerRow: event.target.value === '' ? null : Number(event.target.value),
            })
          }
        />
      </div>
      <div className="border-hem grid gap-3 border-t border-dashed pt-4 sm:grid-cols-2 lg:grid-cols-4">
        {headings.map((heading, column) => (
          <SelectField
            key={column}
            label={heading}
            options={options}
            value={valueOf(mapping.columns[column] ?? { field: 'extra' })}
            hint={sampleOf(rows, mapping.headerRow, column)}
            onChange={(event) =>
              onMapping({
                ...mapping,
                columns: assign(mapping.columns, headings.length, column, event.target.value),
              })
            }
          />
        ))}
      </div>
      {notes.length > 0 && (
        <div className="mt-4">
          <Notice tone="note">
            <ul className="grid gap-1">
              {notes.map((note) => (
                <li key={note}>{note}</li>
              ))}
            </ul>
          </Notice>
        </div>
      )}
    </Card>
  );
}

/** The first cells of a column, so that a person sees what they match. */
const sampleOf = (rows: readonly (readonly string[])[], headerRow: number | null, column: number): string =>
  rows
    .slice((headerRow ?? -1) + 1)
    .map((row) => (row[column] ?? '').trim())
    .filter((cell) => cell !== '')
    .slice(0, 3)
    .join(', ')
    .slice(0, 60) || 'nothing in it';

/**
 * A thing stands in one column only: choosing it for this one lets the other go back to being kept as it is. A whole
 * name and its parts exclude each other.
 */
function assign(
  columns: readonly ColumnTarget[],
  width: number,
  column: number,
  value: string,
): ColumnTarget[] {
  const chosen = targetOf(value);
  return Array.from({ length: Math.max(width, columns.length) }, (_, at): ColumnTarget => {
    const present = columns[at] ?? { field: 'extra' };
    return at === column ? chosen : giveWay(present, chosen);
  });
}

function giveWay(present: ColumnTarget, chosen: ColumnTarget): ColumnTarget {
  if (present.field === 'size') {
    if (chosen.field !== 'size') return present;
    const garments = present.garments.filter((garment) => !chosen.garments.includes(garment));
    return garments.length > 0 ? { field: 'size', garments } : { field: 'extra' };
  }
  if (present.field === 'extra' || present.field === 'leave out') return present;
  const parts = ['firstName', 'lastName'];
  const excludes =
    (chosen.field === 'name' && parts.includes(present.field)) ||
    (present.field === 'name' && parts.includes(chosen.field));
  return present.field === chosen.field || excludes ? { field: 'extra' } : present;
}
