import type { BaseMapAnswer, SiteRow } from '@/lib/api';
import type { LonLat } from '@/lib/geo';
import { literal } from 'sequelize';
import type { Literal } from 'sequelize/types/utils';
import type { db } from '../database';

export type Listed = Pick<
  db.Site,
  'id' | 'name' | 'place' | 'longitude' | 'latitude' | 'changed_at' | 'ground_saved_at'
> & {
  layouts: number | string;
  last_saved: Date | string | null;
};

const ofLayouts = (expression: string) =>
  `(SELECT ${expression} FROM layouts WHERE layouts.agency_id = Site.agency_id AND layouts.site_id = Site.id)`;

/** What a row of the list is made of, counted in the same query. */
export const LISTED: (string | [Literal, string])[] = [
  'id',
  'name',
  'place',
  'longitude',
  'latitude',
  'changed_at',
  'ground_saved_at',
  [literal(ofLayouts('COUNT(*)')), 'layouts'],
  [literal(ofLayouts('MAX(saved_at)')), 'last_saved'],
];

export const placeOf = (site: Pick<db.Site, 'longitude' | 'latitude'>): LonLat | null =>
  site.longitude === null || site.latitude === null ? null : [site.longitude, site.latitude];

export const siteRow = (site: Listed): SiteRow => ({
  id: site.id,
  name: site.name,
  where: site.place,
  at: placeOf(site),
  layouts: Number(site.layouts),
  changed_at: new Date(
    Math.max(
      site.changed_at.getTime(),
      site.ground_saved_at.getTime(),
      site.last_saved === null ? 0 : new Date(site.last_saved).getTime(),
    ),
  ).toISOString(),
});

export const baseMapAnswer = (map: db.BaseMap | null | undefined): BaseMapAnswer | null =>
  map?.pack
    ? {
        pack: map.pack,
        version: map.version,
        min_zoom: map.min_zoom,
        max_zoom: map.max_zoom,
        bounds: map.bounds,
        attribution: map.attribution,
      }
    : null;
