'use client';

import { useRef, useState } from 'react';

export type Taken<T> = { ok: true; list: T } | { ok: false; message: string };

/**
 * What a person brought as a list: the file or the pasted text, and why it was refused. `onList` gets what was read, and
 * null as soon as that no longer is what was brought: the answer about an earlier file never comes in after a later one.
 */
export function useListSource<T>(
  read: { file: (file: File) => Promise<Taken<T>>; paste: (text: string) => Taken<T> },
  onList: (list: T | null) => void,
) {
  const [file, setFile] = useState<File | null>(null);
  const [text, setText] = useState('');
  const [refusal, setRefusal] = useState<string>();
  const [busy, setBusy] = useState(false);
  const turn = useRef(0);

  const take = (taken: Taken<T>) => {
    onList(taken.ok ? taken.list : null);
    setRefusal(taken.ok ? undefined : taken.message);
  };
  const begin = (picked: File | null) => {
    turn.current += 1;
    setFile(picked);
    setRefusal(undefined);
    setBusy(picked !== null);
    return turn.current;
  };
  const onFile = async (picked: File | null) => {
    const mine = begin(picked);
    onList(null);
    if (picked === null) return;
    const taken = await read.file(picked).catch((): Taken<T> => ({
      ok: false,
      message: 'The file did not reach the server. Check the connection and pick it again.',
    }));
    if (mine !== turn.current) return;
    setBusy(false);
    take(taken);
  };
  const onReadPaste = () => {
    begin(null);
    take(read.paste(text));
  };
  return {
    /** Takes the same list read in another way; when that fails the first reading stays. */
    takeAnew: (taken: Taken<T>) => {
      if (taken.ok) take(taken);
      else setRefusal(taken.message);
    },
    /** Everything that ListSource needs. */
    shown: {
      busy,
      file,
      onFile: (picked: File | null) => void onFile(picked),
      text,
      onText: setText,
      onReadPaste,
      refusal,
    },
  };
}
