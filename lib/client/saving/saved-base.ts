import type { Sheet } from '../../layout';
import type { SavedBase } from '../drawing-store';
import type { Stale } from './sending';

/** A part of the sheet that the server has confirmed, with its new version. */
export type Confirmed = Partial<Sheet> &
  Partial<Pick<SavedBase, 'layoutVersion' | 'groundVersion'>>;

/** Sheets share what did not change, so identity tells at once whether anything is unsaved. */
export const isDirty = (present: Sheet, base: SavedBase): boolean =>
  present.layout !== base.sheet.layout || present.site !== base.sheet.site;

export function rebase(base: SavedBase, part: Confirmed): SavedBase {
  const { layout = base.sheet.layout, site = base.sheet.site, ...versions } = part;
  return { ...base, ...versions, sheet: { layout, site } };
}

/** The next save is measured against their version instead of ours. */
export const ontoTheirs = (base: SavedBase, stale: Stale): SavedBase =>
  stale.what === 'layout'
    ? rebase(base, { layout: stale.theirs.layout, layoutVersion: stale.theirs.version })
    : rebase(base, { site: stale.theirs.ground, groundVersion: stale.theirs.version });
