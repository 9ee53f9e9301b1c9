'use client';

import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { FileDrop } from '@/components/ui/file-drop';
import { Notice } from '@/components/ui/notice';
import { Textarea } from '@/components/ui/textarea';
import { fileLimits } from '@/lib/domain/roster/import/limits';

/**
 * Where a list comes from: a file dropped or picked, or cells pasted, and why it was refused. What was chosen and typed
 * is the caller's to keep.
 */
export function ListSource({
  accepts,
  hint,
  busy,
  file,
  onFile,
  text,
  onText,
  onReadPaste,
  refusal,
}: {
  accepts: string[];
  hint: string;
  busy: boolean;
  file: File | null;
  onFile: (file: File | null) => void;
  text: string;
  onText: (text: string) => void;
  onReadPaste: () => void;
  refusal: string | undefined;
}) {
  return (
    <>
      <div className="grid gap-4 lg:grid-cols-2">
        <FileDrop
          label={busy ? 'Reading the file' : 'Drop a list here, or pick a file'}
          accepts={accepts}
          maxBytes={fileLimits.bytes}
          hint={hint}
          file={file}
          onFile={onFile}
        />
        <div className="grid content-start gap-2">
          <Field label="Or paste cells from a spreadsheet">
            {(wiring) => (
              <Textarea
                {...wiring}
                rows={4}
                spellCheck={false}
                className="font-mono"
                value={text}
                onChange={(event) => onText(event.target.value)}
              />
            )}
          </Field>
          <div>
            <Button
              size="sm"
              onClick={onReadPaste}
              unavailable={text.trim() === '' ? 'Paste the cells first.' : undefined}
            >
              Read the paste
            </Button>
          </div>
        </div>
      </div>
      {refusal !== undefined && (
        <div className="mt-4">
          <Notice tone="stop" live="assertive" title="This list cannot be read">
            {refusal}
          </Notice>
        </div>
      )}
    </>
  );
}
