import type {
  ChecksAnswer,
  CreatedLayout,
  GroundSave,
  LayoutAnswer,
  LayoutSave,
  NewLayout,
  NewSite,
  SavedAnswer,
  SiteAnswer,
  SiteChange,
} from '@/lib/api';
import { PATHS } from './paths';
import { address, request } from './request';

/** Everything that changes something, each a promise that throws `Problem`. */

export const readLayout = (layoutId: string) => request<LayoutAnswer>(PATHS.layout(layoutId));

/** `version` is the one the change was made from; a 412's `current` is a StaleLayout. */
export const saveLayout = (
  layoutId: string,
  version: number,
  body: LayoutSave,
  options: { signal?: AbortSignal; keepalive?: boolean } = {},
) =>
  request<SavedAnswer>(PATHS.layout(layoutId), {
    method: 'PUT',
    body,
    ifMatch: version,
    ...options,
  });

/** `version` is the ground's, not the layout's; a 412's `current` is a StaleGround. */
export const saveGround = (siteId: string, version: number, body: GroundSave) =>
  request<SavedAnswer>(PATHS.ground(siteId), { method: 'PUT', body, ifMatch: version });

export const createSite = (body: NewSite) =>
  request<SiteAnswer>(PATHS.sites, { method: 'POST', body });

export const changeSite = (siteId: string, body: SiteChange) =>
  request<SiteAnswer>(PATHS.site(siteId), { method: 'PATCH', body });

export const createLayout = (siteId: string, body: NewLayout) =>
  request<CreatedLayout>(PATHS.layouts(siteId), { method: 'POST', body });

/** Makes an older version the newest. What was newest stays in the history. */
export const restoreVersion = (layoutId: string, version: number) =>
  request<SavedAnswer>(PATHS.restore(layoutId), { method: 'POST', body: { version } });

export const checkFile = (file: unknown, at?: string) =>
  request<ChecksAnswer>(address(PATHS.checks, { at }), { method: 'POST', body: file });
