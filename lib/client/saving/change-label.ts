import type { History } from '../../edits';
import type { Sheet } from '../../layout';

/** As lib/api's label allows at most; the contract's own schema would bring zod along. */
const LABEL_MOST = 200;
/** What the history will call a save that takes `saved` to the present: "Move R2 and 2 more". */
export function changeLabel(history: History, saved: Sheet): string {
  const isSaved = (sheet: Sheet): boolean =>
    sheet.layout === saved.layout && sheet.site === saved.site;
  const since = history.past.findLastIndex((entry) => isSaved(entry.sheet));
  const undone = history.future.findIndex((entry) => isSaved(entry.sheet));
  if (since < 0 && undone >= 0) return cut(`Undo ${history.future[undone]!.label}`);
  const labels = history.past.slice(Math.max(since, 0)).map((entry) => entry.label);
  const last = labels.at(-1) ?? 'Change the drawing';
  return cut(labels.length > 1 ? `${last} and ${labels.length - 1} more` : last);
}

const cut = (label: string): string =>
  label.length <= LABEL_MOST ? label : `${label.slice(0, LABEL_MOST - 1)}…`;
