import { expect, test } from 'vitest';
import { commit, newHistory, redo, redoLabel, undo, undoLabel, type Edit } from '@/lib/edits';
import { findPiece } from '@/lib/layout';
import { everythingMet } from './everything';

const sheet = everythingMet();
const headR: Edit = { type: 'turn', id: 'rv', heading_deg: 90 };
const calm: Edit = { type: 'set-conditions', conditions: { wind: { speed_mph: 2 } } };

test('each gesture is one entry that undo names, takes back and redo puts again', () => {
  const one = commit(newHistory(sheet), headR, 'Turn receiving vehicle');
  const two = commit(one, [calm, { type: 'remove', ids: ['pu'] }], 'Set wind, remove pump');
  expect([undoLabel(two), redoLabel(two)]).toEqual(['Set wind, remove pump', null]);

  const back = undo(undo(two));
  expect(back.present).toBe(sheet);
  expect([undoLabel(back), redoLabel(back)]).toEqual([null, 'Turn receiving vehicle']);

  const again = redo(redo(back));
  expect(again.present).toBe(two.present);
  expect(undoLabel(again)).toBe('Set wind, remove pump');
});

test('a new gesture forgets what was undone', () => {
  const undone = undo(commit(newHistory(sheet), headR, 'Turn receiving vehicle'));
  expect(redoLabel(commit(undone, calm, 'Set wind'))).toBeNull();
});

test('a gesture that changes nothing leaves no entry and keeps what can be redone', () => {
  const undone = undo(commit(newHistory(sheet), headR, 'Turn receiving vehicle'));
  const rv = findPiece(sheet, 'rv');
  if (rv?.kind !== 'receiving-vehicle') throw new Error('no receiving vehicle');
  expect(commit(undone, { type: 'move', moves: [{ id: 'rv', to: rv.at }] }, 'Move')).toBe(undone);
  expect(undo(newHistory(sheet)).present).toBe(sheet);
});

test('steps of one gesture share its entry until another comes between', () => {
  const step = (heading_deg: number): Edit => ({ type: 'turn', id: 'rv', heading_deg });
  let history = commit(newHistory(sheet), step(70), 'Turn', 'key-1');
  history = commit(history, step(80), 'Turn', 'key-1');
  expect(history.past).toHaveLength(1);
  expect(undo(history).present).toBe(sheet);
  history = commit(commit(history, calm, 'Set wind'), step(90), 'Turn', 'key-1');
  expect(history.past.map((entry) => entry.label)).toEqual(['Turn', 'Set wind', 'Turn']);
});

test('a bad edit throws and leaves the history as it was', () => {
  const history = commit(newHistory(sheet), headR, 'Turn');
  const bad: Edit = { type: 'remove', ids: ['nobody'] };
  expect(() => commit(history, [calm, bad], 'Remove')).toThrow(
    expect.objectContaining({ pieceId: 'nobody' }),
  );
  expect(undoLabel(history)).toBe('Turn');
});
