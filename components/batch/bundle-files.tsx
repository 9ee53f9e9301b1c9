import { formatBytes } from '@/lib/domain/text/format-bytes';

type File = { path: string; label: string; bytes: number; href: string };

const kindOf = (path: string): string => (path.split('.').at(-1) ?? '').toUpperCase();

/**
 * The files of a bundle, one row for each thing with a link for every kind it comes in. Props: `files` in their
 * order; those that share a label stand in one row.
 */
export function BundleFiles({ files }: { files: readonly File[] }) {
  const rows = new Map<string, File[]>();
  for (const file of files) rows.set(file.label, [...(rows.get(file.label) ?? []), file]);
  return (
    <ul>
      {[...rows].map(([label, group]) => (
        <li key={label} className="border-hem flex items-center justify-between gap-4 border-t px-4 py-2.5">
          <span className="min-w-0 break-words">{label}</span>
          <span className="flex shrink-0 gap-3">
            {group.map((file) => (
              <a
                key={file.path}
                href={file.href}
                download
                className="text-damson type-code touch inline-flex items-center underline underline-offset-3 hover:decoration-2"
                aria-label={`${label}, ${kindOf(file.path)}, ${formatBytes(file.bytes)}`}
                title={formatBytes(file.bytes)}
              >
                {kindOf(file.path)}
              </a>
            ))}
          </span>
        </li>
      ))}
    </ul>
  );
}
