'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { setNonce } from 'get-nonce';
import { useState, type ReactNode } from 'react';
import { ToastProvider } from './ui/toast';

/**
 * What every page stands in: the query cache and the toasts. Props: `nonce` of the page's content security policy, for
 * the style tag that dialogs and menus put in while they are open.
 */
export function Providers({ nonce, children }: { nonce: string | undefined; children: ReactNode }) {
  // The document keeps the policy it was loaded with; a refresh brings a newer nonce that it would refuse.
  useState(() => {
    if (nonce !== undefined && typeof window !== 'undefined') setNonce(nonce);
  });
  const [queries] = useState(
    () => new QueryClient({ defaultOptions: { queries: { staleTime: 15_000, retry: 1 } } }),
  );
  return (
    <QueryClientProvider client={queries}>
      <ToastProvider>{children}</ToastProvider>
    </QueryClientProvider>
  );
}
