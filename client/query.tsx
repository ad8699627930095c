'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { ApiProblem } from './api';

/** A refusal will be refused again; only a dead line is worth another try. */
const retry = (failures: number, error: Error) => !(error instanceof ApiProblem) && failures < 2;

export function QueryProvider({ children }: { readonly children: ReactNode }) {
  const [client] = useState(
    () => new QueryClient({ defaultOptions: { queries: { retry, staleTime: 2_000 }, mutations: { retry: false } } }),
  );
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
