'use client';

import { useQuery } from '@tanstack/react-query';
import type { Airframe } from '@/lib/airframe/schema/airframe';
import type { DraftAnswer, DraftSaved } from '@/lib/contract/answers';
import { api } from './api';

export interface DraftPlace {
  readonly workshopId: string;
  readonly designId: string;
}

export const draftPath = ({ workshopId, designId }: DraftPlace): string =>
  `/api/workshops/${encodeURIComponent(workshopId)}/designs/${encodeURIComponent(designId)}/draft`;

export const draftKey = ({ workshopId, designId }: DraftPlace) => ['draft', workshopId, designId] as const;

export const fetchDraft = async (place: DraftPlace, signal?: AbortSignal): Promise<DraftAnswer> =>
  (await api.get<DraftAnswer>(draftPath(place), { signal })).data;

/** Saves a draft on top of a version and answers the version that this made. */
export async function saveDraft(place: DraftPlace, airframe: Airframe, version: number): Promise<number> {
  const { data } = await api.put<DraftSaved>(draftPath(place), { airframe }, { ifMatch: `"${version}"` });
  return data.version;
}

/** The newest draft, asked for again every `everyMs`; `paused` stops the asking. */
export const useDraft = (
  place: DraftPlace,
  { everyMs, paused }: { readonly everyMs: number; readonly paused: boolean },
) =>
  useQuery({
    queryKey: draftKey(place),
    queryFn: ({ signal }) => fetchDraft(place, signal),
    enabled: !paused,
    refetchInterval: paused ? false : everyMs,
    refetchIntervalInBackground: false,
    staleTime: everyMs,
  });
