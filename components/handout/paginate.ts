/** Something that must not be torn, and how high it stands, mm. */
export type Block<T> = {
  readonly heightMm: number;
  /** What a page needs above it where it comes first there, such as column heads once more. */
  readonly leadMm?: number;
  readonly item: T;
};

/**
 * Blocks in order on as few pages as hold them. A block marked `withNext` never ends a page: a
 * heading goes with what it heads. One higher than a page gets a page of its own.
 */
export function paginate<T extends { readonly withNext?: boolean }>(
  blocks: readonly Block<T>[],
  pageMm: number,
): T[][] {
  const pages: T[][] = [];
  let page: T[] = [];
  let used = 0;
  for (let i = 0; i < blocks.length; i++) {
    const { heightMm, item } = blocks[i]!;
    const start = i === 0 || !blocks[i - 1]!.item.withNext;
    const needed = start ? heldTogether(blocks, i) : heightMm;
    if (page.length > 0 && used + needed > pageMm && start) {
      pages.push(page);
      page = [];
      used = blocks[i]!.leadMm ?? 0;
    }
    page.push(item);
    used += heightMm;
  }
  return page.length > 0 ? [...pages, page] : pages;
}

/** Height of the block and of those it must stand with. */
function heldTogether<T extends { readonly withNext?: boolean }>(
  blocks: readonly Block<T>[],
  from: number,
): number {
  let height = 0;
  for (let i = from; i < blocks.length; i++) {
    height += blocks[i]!.heightMm;
    if (!blocks[i]!.item.withNext) break;
  }
  return height;
}
