import { expect, test } from 'vitest';
import { describe, type Edit } from '@/lib/edits';
import { everythingMet } from './everything';

const sheet = everythingMet();
const at = sheet.layout.origin;

test.each<[Edit, string]>([
  [{ type: 'place', pieces: [{ id: 'x', kind: 'rod', label: 'C3', system: 'C', at }] }, 'Place rod C3'], // prettier-ignore
  [{ type: 'place', pieces: [{ id: 'x', kind: 'release-point', at }] }, 'Place release point'],
  [{ type: 'move', moves: [{ id: 'rod-5', to: at }] }, 'Move R2'],
  [{ type: 'move', moves: [{ id: 'Z', to: at }, { id: 'T', to: at }] }, 'Move 2 pieces'], // prettier-ignore
  [{ type: 'reshape', id: 'hot', part: 0, vertex: 0, to: at }, 'Reshape hot zone'],
  [{ type: 'reshape', id: 'hot', part: 0, vertex: 0, to: at, insert: true }, 'Add a corner to hot zone'], // prettier-ignore
  [{ type: 'reshape', id: 'hot', part: 0, vertex: 0, to: null }, 'Take a corner out of hot zone'],
  [{ type: 'turn', id: 'cv', heading_deg: 0 }, 'Turn casualty vehicle'],
  [{ type: 'remove', ids: ['YC'] }, 'Remove Y probe for C'],
  [{ type: 'join', id: 'g1', end: 'to', piece: 'rod-2' }, 'Join ground cable to C2'],
  [{ type: 'set-piece', id: 'rod-1', members: { length_ft: 4 } }, 'Change C1'],
  [{ type: 'renumber' }, 'Renumber rods'],
  [{ type: 'set-conditions', conditions: { wind: null, slope: null } }, 'Set wind and slope'],
  [{ type: 'set-layout', members: { planned_at: null } }, 'Set planned time'],
  [{ type: 'set-ground', answers: { electric: null } }, "Record owner's answer for electric"],
  [{ type: 'set-ground', overhead_none_known_as_of: null, locates: [] }, 'Record locate tickets and overhead lines'], // prettier-ignore
  [{ type: 'together', edits: [{ type: 'renumber' }] }, 'Renumber rods'],
  [{ type: 'together', edits: [{ type: 'renumber' }, { type: 'remove', ids: ['Z'] }] }, 'Renumber rods and 1 more'], // prettier-ignore
  [{ type: 'together', edits: [] }, 'Change nothing'],
  [{ type: 'replace', sheet }, 'Put another layout in its place'],
])('%o is called %s', (edit, words) => expect(describe(sheet, edit)).toBe(words));
