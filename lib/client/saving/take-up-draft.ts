import type { Sheet } from '../../layout';
import type { DrawingStore } from '../drawing-store';
import type { Draft } from './draft-shelf';
import { sameDocument } from './same-document';

/** What the draft holds beyond what the server has; null where that is nothing. */
export function draftSheet(store: DrawingStore, draft: Draft): Sheet | null {
  const { sheet } = store.getState().base;
  const part = <T>(changed: boolean, kept: T, saved: T): T =>
    changed && !sameDocument(kept, saved) ? kept : saved;
  const layout = part(draft.changed.layout, draft.sheet.layout, sheet.layout);
  const site = part(draft.changed.site, draft.sheet.site, sheet.site);
  return layout === sheet.layout && site === sheet.site ? null : { layout, site };
}

/**
 * Puts the draft on the drawing as one change that can be undone. It is saved against the versions
 * it came from, so what others saved since is asked about and not written over.
 */
export function takeUpDraft(store: DrawingStore, draft: Draft): void {
  const sheet = draftSheet(store, draft);
  if (!sheet) return;
  const { base, setBase, apply } = store.getState();
  const { layoutVersion, groundVersion } = draft;
  setBase({
    ...base,
    layoutVersion: sheet.layout === base.sheet.layout ? base.layoutVersion : layoutVersion,
    groundVersion: sheet.site === base.sheet.site ? base.groundVersion : groundVersion,
  });
  apply({ type: 'replace', sheet }, 'Take up the changes kept in this browser');
}
