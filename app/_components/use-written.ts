'use client';

import { useState } from 'react';

/**
 * A value that is edited as text. The text stays as typed for as long as it says the same value (a comma just begun, a
 * space at the end); when the value is changed from elsewhere the text follows it. `write` of the value gives the text
 * to begin with. Answers the text to show and what to do with what is typed.
 */
export function useWritten<T>(
  value: T,
  how: { read: (text: string) => T; write: (value: T) => string },
  onChange: (value: T) => void,
): { value: string; type: (text: string) => void } {
  const [typed, setTyped] = useState(() => how.write(value));
  const same = JSON.stringify(how.read(typed)) === JSON.stringify(value);
  return {
    value: same ? typed : how.write(value),
    type: (text) => {
      setTyped(text);
      onChange(how.read(text));
    },
  };
}
