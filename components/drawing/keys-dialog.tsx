'use client';

import { Dialog } from '@/components/ui/dialog';
import { useScreen } from './screen-store';

const KEYS: readonly (readonly [string, string])[] = [
  ['Tab', 'from piece to piece on the plan'],
  ['Enter', 'opens the stake tag of the piece; with something in hand, puts it down'],
  ['Arrows', 'move the piece 1 ft; with Shift 0.1 ft; with something in hand, lead the cross'],
  ['[ and ]', 'turn a unit 5°; with Shift 1°'],
  ['Delete', 'removes the piece, or the corner that has the focus'],
  ['Backspace', 'takes back the last corner of what is being drawn'],
  ['Escape', 'lets go: the drag, the outline, what is in hand, the selection'],
  ['Ctrl Z', 'undo'],
  ['Ctrl Shift Z', 'redo'],
  ['+ and −', 'nearer and farther, with the plan in focus'],
  ['?', 'this list'],
];

/** What the keyboard does on the drawing. */
export function KeysDialog() {
  const showKeys = useScreen((state) => state.showKeys);
  return (
    <Dialog open onOpenChange={showKeys} title="Keys on the drawing">
      <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-5 gap-y-2">
        {KEYS.map(([key, does]) => (
          <div key={key} className="contents">
            <dt className="font-bold">{key}</dt>
            <dd>{does}</dd>
          </div>
        ))}
      </dl>
    </Dialog>
  );
}
