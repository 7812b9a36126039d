import type { LonLat } from '../geo';
import type { Layout, Locate, Piece, Sheet, SiteGround, Slope, Soil, Wind } from '../layout';

/**
 * A change to the sheet as plain data: it can be saved, sent, undone and offered as a remedy.
 * Positions are quantised when the edit is applied. Ids of new pieces are chosen by the caller.
 */
export type Edit =
  /** Adds pieces together (a rod with its jumper and cable), in the order given. */
  | { readonly type: 'place'; readonly pieces: readonly Piece[] }
  /**
   * Moves pieces by id. A point goes to `to`; a line or area goes whole, its first position to
   * `to`. Ends of runs joined to them follow, and what stands on a moved unit goes along.
   */
  | {
      readonly type: 'move';
      readonly moves: readonly { readonly id: string; readonly to: LonLat }[];
    }
  /** Moves one vertex of a line or ring. `part` is the line or ring it belongs to. */
  | {
      readonly type: 'reshape';
      readonly id: string;
      readonly part: number;
      readonly vertex: number;
      readonly to: LonLat | null;
      /** True puts a new vertex there instead of moving; `to: null` takes the vertex out. */
      readonly insert?: boolean;
    }
  | { readonly type: 'turn'; readonly id: string; readonly heading_deg: number }
  /** Takes pieces away, and the runs that were joined to them. */
  | { readonly type: 'remove'; readonly ids: readonly string[] }
  /** Leads an existing run's end to another piece. */
  | {
      readonly type: 'join';
      readonly id: string;
      readonly end: 'from' | 'to';
      readonly piece: string;
    }
  /** Sets members of one piece other than its place; a member set to null becomes "not entered". */
  | {
      readonly type: 'set-piece';
      readonly id: string;
      readonly members: Readonly<Record<string, unknown>>;
    }
  /** Gives rods the labels C1, C2 … in the order drawn. Ids stay. */
  | { readonly type: 'renumber' }
  | {
      readonly type: 'set-conditions';
      readonly conditions: Partial<Record<'wind', Wind | null>> &
        Partial<Record<'slope', Slope | null>> &
        Partial<Record<'soil', Soil | null>>;
    }
  | {
      readonly type: 'set-layout';
      readonly members: Partial<Pick<Layout, 'name' | 'planned_at' | 'pump' | 'liquid' | 'kit'>>;
    }
  | {
      readonly type: 'set-ground';
      readonly answers?: Partial<SiteGround['answers']>;
      readonly overhead_none_known_as_of?: string | null;
      readonly locates?: readonly Locate[];
    }
  /** Several edits as one, in order, each seeing what those before it did. All or nothing. */
  | { readonly type: 'together'; readonly edits: readonly Edit[] }
  /** The whole sheet at once: an imported file, or an older version brought back. */
  | { readonly type: 'replace'; readonly sheet: Sheet };

export type EditType = Edit['type'];
export type EditOf<T extends EditType> = Extract<Edit, { type: T }>;

/** The edit names something that isn't there or can't be so. Nothing was changed. */
export class EditError extends Error {
  constructor(
    message: string,
    /** The piece at fault, where there is one. */
    readonly pieceId: string | null = null,
  ) {
    super(message);
    this.name = 'EditError';
  }
}
