'use client';

import { type QueryKey, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { api } from '@/client/api';
import type { ThreadAnswer, VerdictRow } from '@/lib/contract/answers';
import type { Anchor, VerdictKind } from '@/lib/contract/bodies';

/** Often enough that a colleague's comment appears while one reads, seldom enough for a small server. A hidden tab asks nothing. */
const POLL_MS = 3_000;

const key = (base: string, what: string): QueryKey => ['revision', base, what];

function usePolled<T extends object>(base: string, what: string, initial: T) {
  return useQuery({
    queryKey: key(base, what),
    queryFn: async ({ signal }) => (await api.get<T>(`${base}/${what}`, { signal })).data,
    initialData: () => initial,
    refetchInterval: POLL_MS,
    refetchIntervalInBackground: false,
    refetchOnWindowFocus: true,
  });
}

/** `base` is the address of the revision in the API. */
export const useThreads = (base: string, initial: readonly ThreadAnswer[]) => usePolled(base, 'threads', initial);
export const useVerdicts = (base: string, initial: readonly VerdictRow[]) => usePolled(base, 'verdicts', initial);

function useSending<Body, Answered>(base: string, act: (body: Body) => Promise<Answered>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: act,
    onSettled: () => client.invalidateQueries({ queryKey: ['revision', base] }),
  });
}

export const useStartThread = (base: string) =>
  useSending(base, (body: { anchor: Anchor; text: string }) => api.post<ThreadAnswer>(`${base}/threads`, body));

export const useAnswer = (base: string, threadId: string) =>
  useSending(base, (body: { text: string }) => api.post(`${base}/threads/${threadId}/comments`, body));

export const useSetThreadState = (base: string, threadId: string) =>
  useSending(base, (body: { state: ThreadAnswer['state'] }) => api.patch(`${base}/threads/${threadId}`, body));

export const useGiveVerdict = (base: string) =>
  useSending(base, (body: { verdict: VerdictKind; note: string }) => api.post<VerdictRow>(`${base}/verdicts`, body));
