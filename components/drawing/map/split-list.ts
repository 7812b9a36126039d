import type { DisplayList, Mark } from '@/lib/draw';

const isWords = (mark: Mark): boolean => mark.type === 'text' || mark.type === 'letters';

/** The list's shapes and its words apart: words become SVG, so that text scaling reaches them. */
export const withoutWords = (list: DisplayList): DisplayList => only(list, (m) => !isWords(m));
export const onlyWords = (list: DisplayList): DisplayList => only(list, isWords);

function only(list: DisplayList, keep: (mark: Mark) => boolean): DisplayList {
  return {
    groups: list.groups
      .map((group) => ({ ...group, marks: group.marks.filter(keep) }))
      .filter((group) => group.marks.length > 0),
  };
}
