'use client';
import { QueryCache, QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { ApiProblem } from '@/lib/api';
import { askToSignIn } from '@/lib/sign-in';

export function Providers({ children }: { readonly children: ReactNode }) {
  const [client] = useState(
    () =>
      new QueryClient({
        queryCache: new QueryCache({
          onError: (error) => {
            if (error instanceof ApiProblem && error.status === 401) askToSignIn();
          },
        }),
        defaultOptions: {
          queries: {
            staleTime: 60_000,
            retry: (count, error) => count < 2 && !(error instanceof ApiProblem && error.status < 500),
          },
        },
      }),
  );
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
