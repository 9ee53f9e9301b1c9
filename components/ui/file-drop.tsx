'use client';

import { useId, useRef, useState, type DragEvent, type ReactNode } from 'react';
import { formatBytes } from '@/lib/domain/text/format-bytes';
import { FieldError } from './field';
import { Icon } from './icon';
import { IconButton } from './icon-button';
import { joinClasses } from './join-classes';

/** Why a file is not taken, as a sentence, or null. `accepts` holds endings such as ".csv"; `maxBytes` is the limit. */
export function judgeFile(
  file: Pick<File, 'name' | 'size'>,
  accepts: readonly string[],
  maxBytes: number,
): string | null {
  const name = file.name.toLowerCase();
  if (!accepts.some((ending) => name.endsWith(ending))) {
    return `${file.name} is not one of ${listEndings(accepts)}. Save the list as one of these and add it again.`;
  }
  if (file.size === 0) return `${file.name} is empty. Check that it was saved, then add it again.`;
  if (file.size > maxBytes) {
    return `${file.name} is larger than ${formatBytes(maxBytes)}, the most we take. Remove pictures and other sheets, then add it again.`;
  }
  return null;
}

const listEndings = (accepts: readonly string[]) =>
  accepts.map((ending) => ending.slice(1).toUpperCase()).join(', ');

/**
 * A place to drop or pick one file; keyboard and screen reader use the file input inside. Props: `label` ("Drop a
 * roster here, or pick a file"), `accepts` endings, `maxBytes`, `hint`, `file` chosen (or null), `onFile(file | null)`.
 */
export function FileDrop({
  label,
  accepts,
  maxBytes,
  hint,
  file,
  onFile,
}: {
  label: string;
  accepts: readonly string[];
  maxBytes: number;
  hint?: ReactNode;
  file: File | null;
  onFile: (file: File | null) => void;
}) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const [refusal, setRefusal] = useState<string>();

  const take = (files: FileList | null) => {
    const first = files?.[0];
    if (first === undefined) return;
    const many = files !== null && files.length > 1 ? 'Add one file at a time.' : null;
    const reason = many ?? judgeFile(first, accepts, maxBytes);
    setRefusal(reason ?? undefined);
    onFile(reason === null ? first : null);
    // The same file can be picked again after it was put right, or when it did not get through.
    if (input.current !== null) input.current.value = '';
  };
  const drop = (event: DragEvent) => {
    event.preventDefault();
    setOver(false);
    take(event.dataTransfer.files);
  };
  const clear = () => {
    setRefusal(undefined);
    onFile(null);
    input.current?.focus();
  };

  return (
    <div className="grid gap-1.5">
      <div
        onDragOver={(event) => {
          event.preventDefault();
          setOver(true);
        }}
        onDragLeave={() => setOver(false)}
        onDrop={drop}
        className={joinClasses(
          'rounded-card relative grid min-h-32 place-items-center border-[1.5px] border-dashed px-4 py-6 text-center focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-damson',
          over
            ? 'border-damson bg-damson-wash'
            : refusal === undefined
              ? 'border-thread bg-card'
              : 'border-stop bg-card',
        )}
      >
        <label htmlFor={id} className="absolute inset-0">
          <span className="sr-only">{label}</span>
        </label>
        <input
          ref={input}
          id={id}
          type="file"
          accept={accepts.join(',')}
          aria-describedby={joinClasses(`${id}-hint`, refusal !== undefined && `${id}-error`)}
          aria-invalid={refusal === undefined ? undefined : true}
          onChange={(event) => take(event.target.files)}
          className="sr-only"
        />
        {file === null ? (
          <div className="pointer-events-none grid justify-items-center gap-1">
            <Icon name="upload" size={22} className="text-dusk" />
            <p className="font-[560]">{label}</p>
          </div>
        ) : (
          <div className="pointer-events-none flex max-w-full items-center gap-2.5 text-left">
            <Icon name="file" size={20} className="text-dusk" />
            <div className="min-w-0">
              <p className="type-code break-all">{file.name}</p>
              <p className="type-small text-dusk">
                {formatBytes(file.size)}. Pick or drop another to replace it.
              </p>
            </div>
            <IconButton
              icon="close"
              label={`Take ${file.name} out`}
              onClick={clear}
              className="pointer-events-auto relative z-10"
            />
          </div>
        )}
      </div>
      <p id={`${id}-hint`} className="type-small text-dusk">
        {hint ?? `${listEndings(accepts)}, up to ${formatBytes(maxBytes)}.`}
      </p>
      <div role="status">
        {refusal !== undefined && <FieldError id={`${id}-error`}>{refusal}</FieldError>}
      </div>
    </div>
  );
}
