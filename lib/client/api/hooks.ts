'use client';

import useSWR, { type SWRConfiguration } from 'swr';
import useSWRInfinite from 'swr/infinite';
import type {
  ChangeAnswer,
  ChangesAnswer,
  GroundAnswer,
  KitsAnswer,
  LayoutAnswer,
  LayoutsAnswer,
  LimitsAnswer,
  SiteAnswer,
  SitesAnswer,
} from '@/lib/api';
import { PATHS } from './paths';
import type { Problem } from './problem';
import { address, request } from './request';

const get = <Answer>(path: string) => request<Answer>(path);

function useAnswer<Answer>(path: string | null, options?: SWRConfiguration<Answer, Problem>) {
  return useSWR<Answer, Problem>(path, get, options);
}

/** A list that grows a page at a time with `more()`. */
function usePages<Answer extends { next_cursor: string | null }>(
  path: string | null,
  query: Record<string, string | undefined> = {},
) {
  const pages = useSWRInfinite<Answer, Problem>((index, previous: Answer | null) => {
    if (path === null || (previous && previous.next_cursor === null)) return null;
    return address(path, { ...query, cursor: previous?.next_cursor ?? undefined });
  }, get);
  return {
    pages: pages.data ?? [],
    error: pages.error,
    isLoading: pages.isLoading,
    hasMore: pages.data?.at(-1)?.next_cursor != null,
    more: () => pages.setSize((size) => size + 1),
    mutate: pages.mutate,
  };
}

export const useSites = (q?: string) => usePages<SitesAnswer>(PATHS.sites, { q });
export const useSite = (siteId: string | null) =>
  useAnswer<SiteAnswer>(siteId && PATHS.site(siteId));
export const useGround = (siteId: string | null) =>
  useAnswer<GroundAnswer>(siteId && PATHS.ground(siteId));
export const useLayouts = (siteId: string | null) =>
  usePages<LayoutsAnswer>(siteId && PATHS.layouts(siteId));
export const useChanges = (layoutId: string | null) =>
  usePages<ChangesAnswer>(layoutId && PATHS.changes(layoutId));
export const useChange = (layoutId: string | null, version: number | null) =>
  useAnswer<ChangeAnswer>(
    layoutId && version !== null ? PATHS.change(layoutId, version) : null,
    // What a version held never changes.
    { revalidateOnFocus: false, revalidateIfStale: false, revalidateOnReconnect: false },
  );
export const useKits = () => useAnswer<KitsAnswer>(PATHS.kits);
export const useLimits = () => useAnswer<LimitsAnswer>(PATHS.limits);

/** The drawing loads once and then keeps its own copy: a refetch must not pull it from under a hand. */
export const useLayout = (layoutId: string | null) =>
  useAnswer<LayoutAnswer>(layoutId && PATHS.layout(layoutId), {
    revalidateOnFocus: false,
    revalidateIfStale: false,
    revalidateOnReconnect: false,
    // Opened anew it must not be the copy that was kept from before its last saves.
    revalidateOnMount: true,
    dedupingInterval: 0,
  });
