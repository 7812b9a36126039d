import { describe, expect, test } from 'vitest';
import type { Edit } from '@/lib/edits';
import { feetToMetres, localPlane } from '@/lib/geo';
import { emptyLayout } from '@/lib/layout';
import { answerOf, drawingOn, ORIGIN } from './drawing-on';

const plane = localPlane(ORIGIN);
const at = (eastFt: number) => plane.toLonLat({ x: feetToMetres(eastFt), y: 0 });

const twoRods = () =>
  answerOf({
    layout: {
      ...emptyLayout(ORIGIN),
      pieces: [
        { id: 'r1', kind: 'rod', label: 'C1', system: 'C', at: at(0) },
        { id: 'r2', kind: 'rod', label: 'C2', system: 'C', at: at(5) },
        { id: 'j', kind: 'jumper', path: [at(0), at(5)], from: 'r1', to: 'r2' },
      ],
    },
  });
const moveTo = (eastFt: number): Edit => ({ type: 'move', moves: [{ id: 'r2', to: at(eastFt) }] });

describe('the drawing', () => {
  test('a preview is judged while it is shown, and leaves no trace', () => {
    const store = drawingOn(twoRods());
    const apart = () =>
      store.getState().findings.find(({ id }) => id === 'rods-apart|r1,r2')?.status;
    expect(apart()).toBe('meets');
    store.getState().setPreview([moveTo(9)]);
    expect(apart()).toBe('not-met');
    expect(store.getState().history.past).toEqual([]);
    store.getState().setPreview(null);
    expect(apart()).toBe('meets');
    expect(store.getState().sheet).toBe(store.getState().history.present);
  });

  test('however often the pointer moves, one frame judges once, the last place', () => {
    const frames: (() => void)[] = [];
    let calledOff = 0;
    const store = drawingOn(twoRods(), (work) => {
      frames.push(work);
      return () => {
        calledOff++;
        frames.splice(frames.indexOf(work), 1);
      };
    });
    for (const feet of [6, 7, 8, 9]) store.getState().setPreview([moveTo(feet)]);
    expect(frames).toHaveLength(1);
    expect(calledOff).toBe(3);
    expect(store.getState().preview).toBeNull();
    frames[0]!();
    expect(store.getState().preview).toEqual([moveTo(9)]);
  });

  test('a change that lands drops the frame that was still to come', () => {
    const frames: (() => void)[] = [];
    const store = drawingOn(twoRods(), (work) => {
      frames.push(work);
      return () => frames.splice(frames.indexOf(work), 1);
    });
    store.getState().setPreview([moveTo(9)]);
    store.getState().apply(moveTo(4), 'Move C2');
    expect(frames).toEqual([]);
    expect(store.getState().preview).toBeNull();
  });

  test('an edit that can’t be is told and changes nothing', () => {
    const store = drawingOn(twoRods());
    const before = store.getState().history;
    expect(store.getState().apply({ type: 'remove', ids: ['nobody'] }, 'Remove')).toBe(false);
    expect(store.getState().history).toBe(before);
    expect(store.getState().complaint).toMatch(/no longer on the drawing/);
  });

  test('undo and redo say what they did', () => {
    const store = drawingOn(twoRods());
    store.getState().apply(moveTo(4), 'Move C2');
    store.getState().undo();
    expect(store.getState().announcement).toBe('Undone: Move C2');
    store.getState().redo();
    expect(store.getState().announcement).toBe('Done again: Move C2');
  });

  test('who may not draw changes nothing, and is told whom to ask', () => {
    const me = { id: 'me', name: 'A scribe', role: 'crew', can: ['agency.see'] } as const;
    const store = drawingOn({ ...twoRods(), me: { ...me, can: [...me.can] } });
    expect(store.getState().save.status).toBe('read-only');
    expect(store.getState().apply(moveTo(4), 'Move C2')).toBe(false);
    expect(store.getState().complaint).toContain('as crew you see layouts but do not draw them');
    expect(store.getState().history.past).toEqual([]);
  });

  test('who keeps the site but does not draw may record an answer and no more', () => {
    const me = { id: 'me', name: 'A clerk', role: 'administrator' } as const;
    const store = drawingOn({
      ...twoRods(),
      me: { ...me, can: ['agency.see', 'site.change'] },
    });
    const answer: Edit = { type: 'set-ground', answers: { sewer: { answer: 'clear' } } };
    expect(store.getState().apply(answer, 'Record answer')).toBe(true);
    expect(store.getState().apply(moveTo(4), 'Move C2')).toBe(false);
    expect(store.getState().history.past).toHaveLength(1);
  });

  test('time alone changes what is answered', () => {
    const store = drawingOn(
      answerOf({
        layout: {
          ...emptyLayout(ORIGIN),
          conditions: { wind: { from_deg: 0, observed_at: '2031-05-04T13:55:00Z' } },
        },
      }),
    );
    const fresh = () => store.getState().findings.find(({ rule }) => rule === 'wind-fresh')?.status;
    expect(fresh()).toBe('meets');
    store.getState().setAsOf('2031-05-04T15:00:00Z');
    expect(fresh()).toBe('caution');
  });
});
