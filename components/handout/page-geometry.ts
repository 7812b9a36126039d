import { PAPERS, type PaperName, type SizeMm } from '@/lib/draw';

/** Where things lie on the first page, mm. The plan's frame stands clear of its ticks' labels. */
export const EDGE_MM = 7;
export const TICKS_MM = 6;
export const FOOT_MM = 10;
export const STRIP_MM = 64;

export type PageGeometry = SizeMm & {
  readonly frame: { readonly left: number; readonly top: number } & SizeMm;
  readonly plan: SizeMm;
};

export function pageGeometry(paper: PaperName): PageGeometry {
  const { widthMm, heightMm } = PAPERS[paper];
  const frame = {
    left: EDGE_MM + TICKS_MM,
    top: EDGE_MM + TICKS_MM,
    widthMm: widthMm - EDGE_MM * 2 - TICKS_MM,
    heightMm: heightMm - EDGE_MM * 2 - TICKS_MM - FOOT_MM,
  };
  return {
    widthMm,
    heightMm,
    frame,
    plan: { widthMm: frame.widthMm - STRIP_MM, heightMm: frame.heightMm },
  };
}

/** The body of a page of tables: inside its side margins, below its head, above its foot. */
export const PAGE_BODY = { sideMm: 11, topMm: 17, footMm: 14 } as const;
