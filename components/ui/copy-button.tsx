'use client';

import { useEffect, useState } from 'react';
import { Button, type ButtonSize } from './button';

/** Copies a link or a code and says so. Props: `text` to copy, `children` the words ("Copy the link"), `size`. */
export function CopyButton({
  text,
  size = 'sm',
  children,
}: {
  text: string;
  size?: ButtonSize;
  children: string;
}) {
  const [outcome, setOutcome] = useState<'copied' | 'refused'>();
  useEffect(() => {
    if (outcome === undefined) return;
    const timer = setTimeout(() => setOutcome(undefined), 4000);
    return () => clearTimeout(timer);
  }, [outcome]);

  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text);
      setOutcome('copied');
    } catch {
      setOutcome('refused');
    }
  };
  return (
    <>
      <Button size={size} icon={outcome === 'copied' ? 'tick' : 'copy'} onClick={() => void copy()}>
        {outcome === 'copied' ? 'Copied' : children}
      </Button>
      <span role="status" className={outcome === 'refused' ? 'type-small text-stop' : 'sr-only'}>
        {outcome === 'copied' && 'Copied'}
        {outcome === 'refused' && 'This browser did not let us copy. Select the text and copy it by hand.'}
      </span>
    </>
  );
}
