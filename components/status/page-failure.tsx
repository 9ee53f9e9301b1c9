'use client';

import { Button } from '@/components/ui/button';
import { ErrorState } from '@/components/ui/error-state';

/** What an error boundary shows. Props: `error` as Next hands it over, `retry`, `title` if the subject is known. */
export function PageFailure({
  error,
  retry,
  title = 'This page could not be made',
}: {
  error: unknown;
  retry: () => void;
  title?: string;
}) {
  return (
    <>
      <h1 className="sr-only">{title}</h1>
      <ErrorState
        title={title}
        reference={readDigest(error)}
        action={
          <Button look="primary" onClick={() => retry()}>
            Try again
          </Button>
        }
      >
        Something failed on our side, not on yours, and nothing that was saved is lost. Try again; if it
        stays, give the reference to whoever runs this server.
      </ErrorState>
    </>
  );
}

/** The id under which the server logged the error, if it came from there. */
function readDigest(error: unknown): string | undefined {
  const digest = error instanceof Error && 'digest' in error ? error.digest : undefined;
  return typeof digest === 'string' ? digest : undefined;
}
