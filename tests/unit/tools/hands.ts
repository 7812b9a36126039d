import { applyEdit, commit, newHistory, undoLabel, type History } from '@/lib/edits';
import { distance, localPlane, metresToFeet, type LonLat } from '@/lib/geo';
import { DEFAULT_LIMIT_VALUES } from '@/lib/limits';
import { emptyLayout, EMPTY_GROUND, findPiece, type Piece, type Sheet } from '@/lib/layout';
import type { InHand } from '@/lib/client/in-hand';
import { IDLE, planTool, withAnotherInHand, type Step, type Under } from '@/lib/client/tools';
import type { Scene, ToolState } from '@/lib/client/tools';

export const origin: LonLat = [-98.3, 41.2];
const plane = localPlane(origin);

/** Feet east and north of the origin. */
export const ft = (east: number, north: number): LonLat =>
  plane.toLonLat({ x: east * 0.3048, y: north * 0.3048 });
export const feetBetween = (a: LonLat, b: LonLat): number =>
  metresToFeet(distance(plane.toPlane(a), plane.toPlane(b)));

/** A casualty vehicle heading east at the origin, rods C1 and C2 north of it with jumper and cable. */
export function smallSheet(): Sheet {
  return applyEdit(
    { layout: emptyLayout(origin), site: EMPTY_GROUND },
    {
      type: 'place',
      pieces: [
        { id: 'cv', kind: 'casualty-vehicle', at: ft(0, 0), heading_deg: 90 },
        { id: 'c1', kind: 'rod', label: 'C1', system: 'C', at: ft(0, 40) },
        { id: 'c2', kind: 'rod', label: 'C2', system: 'C', at: ft(5, 40) },
        { id: 'j', kind: 'jumper', from: 'c1', to: 'c2', path: [ft(0, 40), ft(5, 40)] },
        { id: 'g', kind: 'ground-cable', from: 'cv', to: 'c1', path: [ft(0, 4.25), ft(0, 40)] },
        {
          id: 'zone',
          kind: 'hot-zone',
          rings: [[ft(-30, -30), ft(30, -30), ft(30, 30), ft(-30, 30), ft(-30, -30)]],
        },
        {
          id: 'fence',
          kind: 'metal-line',
          path: [ft(-80, 80), ft(0, 90), ft(80, 80)],
        },
      ],
    },
  );
}

type Press = {
  on?: Under;
  pointer?: 'mouse' | 'touch';
  id?: number;
  clicks?: number;
  fine?: boolean;
};

/** One pair of hands at one drawing: turns gestures into events and does what the steps say. */
export class Hands {
  state: ToolState = IDLE;
  history: History;
  selection: string | null = null;
  inHand: InHand | null = null;
  previewed: Sheet | null = null;
  said: string[] = [];
  taken = false;
  canChangeSite = true;
  canDraw = true;
  private ids = 0;

  constructor(sheet: Sheet = smallSheet()) {
    this.history = newHistory(sheet);
  }

  scene(): Scene {
    return {
      sheet: this.history.present,
      selection: this.selection,
      inHand: this.inHand,
      limits: DEFAULT_LIMIT_VALUES,
      newId: () => `new-${++this.ids}`,
      canDraw: this.canDraw,
      canChangeSite: this.canChangeSite,
    };
  }

  /** Ten pixels to the foot, north up. */
  private pointer(type: 'down' | 'move' | 'up', at: LonLat, press: Press): this {
    const { x, y } = plane.toPlane(at);
    const perMetre = 10 / 0.3048;
    return this.send((state) =>
      planTool(
        state,
        {
          type,
          pointerId: press.id ?? 1,
          pointer: press.pointer ?? 'mouse',
          at,
          px: { x: x * perMetre, y: -y * perMetre },
          under: press.on ?? null,
          metresPerPx: 0.3048 / 10,
          fine: press.fine ?? false,
          clicks: press.clicks ?? 1,
        },
        this.scene(),
      ),
    );
  }

  down = (at: LonLat, press: Press = {}) => this.pointer('down', at, press);
  move = (at: LonLat, press: Press = {}) => this.pointer('move', at, press);
  up = (at: LonLat, press: Press = {}) => this.pointer('up', at, press);
  click = (at: LonLat, press: Press = {}) => this.down(at, press).up(at, press);
  drag = (from: LonLat, to: LonLat, press: Press = {}) =>
    this.down(from, press).move(to, press).up(to, press);

  lose(type: 'cancel' | 'lost-capture', pointerId = 1): this {
    return this.send((state) => planTool(state, { type, pointerId }, this.scene()));
  }

  key(
    key: string,
    more: { on?: Under; fine?: boolean; far?: boolean; repeat?: boolean } = {},
  ): this {
    const { on = null, fine = false, far = false, repeat = false } = more;
    const where = { middleOfView: ft(0, 0), metresPerPx: 0.3048 / 10 };
    return this.send((state) =>
      planTool(state, { type: 'key', key, under: on, fine, far, repeat, ...where }, this.scene()),
    );
  }

  take(kind: InHand['kind'], members: InHand['members'] = {}): this {
    this.inHand = { kind, words: kind, members };
    this.state = withAnotherInHand(this.state);
    return this;
  }

  private send(act: (state: ToolState) => Step): this {
    const step = act(this.state);
    this.state = step.state;
    this.taken = step.taken ?? false;
    if (step.announce) this.said.push(step.announce);
    if (step.preview !== undefined) {
      this.previewed = step.preview && step.preview.reduce(applyEdit, this.history.present);
    }
    if (step.edits) {
      this.history = commit(this.history, step.edits, step.label ?? '', step.gesture);
      this.previewed = null;
    }
    if (step.select !== undefined) this.selection = step.select;
    if (step.putDown) this.inHand = null;
    return this;
  }

  get pieces(): readonly Piece[] {
    return this.history.present.layout.pieces;
  }
  get entries(): number {
    return this.history.past.length;
  }
  get lastEntry(): string | null {
    return undoLabel(this.history);
  }
  get(id: string): Piece {
    const piece = findPiece(this.history.present, id);
    if (!piece) throw new Error(`no piece ${id}`);
    return piece;
  }
  at(id: string): LonLat {
    const piece = this.get(id);
    if (!('at' in piece)) throw new Error(`${id} is no point`);
    return piece.at;
  }
}

export const on = (id: string): Under => ({ type: 'piece', id });
