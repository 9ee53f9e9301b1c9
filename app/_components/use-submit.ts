'use client';

import { useState } from 'react';
import type { ActionResult } from '@/lib/web/action-result';

type Outcome = 'leaving' | undefined | void;
type Failure = { code: string; message: string; fields: Record<string, string> };

/**
 * Sends a form to an action once at a time and keeps what went wrong, so that the page can say it beside the inputs.
 * The inputs stay as they are: this never resets a form. `onDone` runs after a success. When it sends the
 * person to another page it answers `leaving`: the button then stays busy, so that nothing is sent twice while that page
 * loads.
 */
export function useSubmit<I extends unknown[], T>(
  action: (...input: I) => Promise<ActionResult<T>>,
  onDone: (data: T) => Outcome | Promise<Outcome>,
) {
  const [pending, setPending] = useState(false);
  const [failure, setFailure] = useState<Failure>();

  const submit = async (...input: I): Promise<void> => {
    if (pending) return;
    setPending(true);
    setFailure(undefined);
    let leaving = false;
    try {
      const result = await action(...input);
      if (result.ok) leaving = (await onDone(result.data)) === 'leaving';
      else setFailure(result.error);
    } catch {
      setFailure({
        code: 'offline',
        message:
          'That did not reach the server. What you typed is still here: check the connection and send it again.',
        fields: {},
      });
    } finally {
      if (!leaving) setPending(false);
    }
  };

  return { submit, pending, failure, fields: failure?.fields ?? {}, forget: () => setFailure(undefined) };
}

/** The text of one input of a form; empty when there is none. */
export function readText(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}
