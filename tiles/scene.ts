import type { LonLat } from '../lib/geo';

/** Feet east and north of the scene's origin. */
export type Ft = readonly [east: number, north: number];

/** A wave laid over the even slope, so that contours wander as they do on real ground. */
export type Swell = {
  readonly length_ft: number;
  readonly toward_deg: number;
  readonly height_ft: number;
  readonly phase_deg: number;
};

export type Ground = {
  /** Height at the origin. */
  readonly height_ft: number;
  readonly down_deg: number;
  readonly grade_pct: number;
  readonly swells: readonly Swell[];
  /** The slope is exactly as named within this distance of the origin, where layouts are drawn. */
  readonly working_radius_ft: number;
};

export type Surface = 'asphalt' | 'concrete' | 'gravel';

export type Road = {
  readonly id: string;
  /** Points the centre line passes through; it bends smoothly between them. */
  readonly centre: readonly Ft[];
  readonly width_ft: number;
  readonly surface: Surface;
  /** Painted lines, feet right (+) or left (−) of the centre looking along it. */
  readonly lines: readonly { readonly offset_ft: number; readonly dashed: boolean }[];
  /** Carried over the other ways on a bridge. */
  readonly over?: true;
};

export type Hardstand = {
  readonly id: string;
  readonly outline: readonly Ft[];
  readonly surface: Surface;
};

export type FixedThing = {
  readonly id: string;
  readonly name: string;
  readonly at: Ft;
  readonly looks: 'sign' | 'hydrant' | 'light' | 'marker';
};

export type Name = {
  readonly text: string;
  readonly at: Ft;
  /** Direction the words read in; left out, they stand level on the screen. */
  readonly toward_deg?: number;
  readonly weight: 'place' | 'way' | 'thing' | 'water';
  /** What the words lie on, where that isn't open ground. */
  readonly on?: Surface | 'building';
  /** Shown at this zoom and closer. */
  readonly from_zoom: number;
};

/**
 * One invented place as plain data. The base map is drawn from it and the site's ground (no-drive
 * ground, rails, fixed points …) is taken from it, so that the two can't disagree.
 */
export type Scene = {
  /** The pack's name in addresses and in the database. */
  readonly pack: string;
  readonly name: string;
  readonly attribution: string;
  readonly origin: LonLat;
  readonly extent: Extent;
  /** Drawn one zoom closer than the rest. */
  readonly close_up: Extent;
  readonly ground: Ground;
  readonly roads: readonly Road[];
  readonly hardstands: readonly Hardstand[];
  readonly rails: readonly { readonly id: string; readonly centre: readonly Ft[] }[];
  readonly buildings: readonly { readonly id: string; readonly outline: readonly Ft[] }[];
  readonly tanks: readonly { readonly at: Ft; readonly diameter_ft: number }[];
  readonly walls: readonly { readonly id: string; readonly path: readonly Ft[] }[];
  readonly ditches: readonly {
    readonly id: string;
    readonly centre: readonly Ft[];
    readonly width_ft: number;
  }[];
  readonly fences: readonly { readonly id: string; readonly path: readonly Ft[] }[];
  readonly guardrails: readonly { readonly id: string; readonly path: readonly Ft[] }[];
  readonly culverts: readonly { readonly id: string; readonly path: readonly Ft[] }[];
  readonly overhead: readonly {
    readonly id: string;
    /** A pole stands at every point. */
    readonly path: readonly Ft[];
  }[];
  readonly fields: readonly {
    readonly outline: readonly Ft[];
    readonly rows_toward_deg: number;
  }[];
  readonly trees: readonly { readonly at: Ft; readonly crown_ft: number }[];
  readonly fixed: readonly FixedThing[];
  readonly names: readonly Name[];
};

export type Extent = {
  readonly west: number;
  readonly south: number;
  readonly east: number;
  readonly north: number;
};
