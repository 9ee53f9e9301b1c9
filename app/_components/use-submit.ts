'use client';

import { useState } from 'react';
import type { ActionResult } from '@/lib/web/action-result';

type Failure = { code: string; message: string; fields: Record<string, string> };

/**
 * Sends a form to an action once at a time and keeps what went wrong, so that the page can say it beside the inputs.
 * The inputs stay as they are: this never resets a form. `onDone` runs after a success and may leave the page; the
 * button stays busy until it has.
 */
export function useSubmit<I extends unknown[], T>(
  action: (...input: I) => Promise<ActionResult<T>>,
  onDone: (data: T) => void | Promise<void>,
) {
  const [pending, setPending] = useState(false);
  const [failure, setFailure] = useState<Failure>();

  const submit = async (...input: I): Promise<void> => {
    if (pending) return;
    setPending(true);
    setFailure(undefined);
    try {
      const result = await action(...input);
      if (result.ok) await onDone(result.data);
      else setFailure(result.error);
    } catch {
      setFailure({
        code: 'offline',
        message:
          'That did not reach the server. What you typed is still here: check the connection and send it again.',
        fields: {},
      });
    } finally {
      setPending(false);
    }
  };

  return { submit, pending, failure, fields: failure?.fields ?? {}, forget: () => setFailure(undefined) };
}

/** The text of one input of a form; empty when there is none. */
export function readText(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}
