'use client';

import { useId, useState } from 'react';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';
import { inArc } from './condition-words';
import { slopeEdit, windEdit } from './condition-edits';
import { ConditionsForm } from './conditions-form';
import { ConditionsWords } from './conditions-words';
import { Dial } from './dial';

/** Wind, slope and soil: the dial, the same in words, and the fields to type them in. */
export function ConditionsPanel() {
  const store = useDrawingStore();
  const conditions = useDrawing((s) => s.sheet.layout.conditions);
  const arc = useDrawing((s) => s.standsFor);
  const canDraw = useDrawing((s) => s.canDraw);
  const [typing, setTyping] = useState(false);
  const formId = useId();
  const from = conditions.wind?.from_deg;

  const clear = (which: 'wind' | 'slope'): void => {
    const { history, apply } = store.getState();
    const before = history.present.layout.conditions;
    if (which === 'wind') apply(windEdit(before, { from_deg: null }), 'Wind direction not known');
    else apply(slopeEdit(before, { down_deg: null }), 'Downhill not known');
  };

  return (
    <section aria-label="Conditions" className="relative px-4 py-2.5">
      <div className="grid grid-cols-[minmax(8rem,10rem)_minmax(0,1fr)] gap-4">
        <Dial
          conditions={conditions}
          arc={arc}
          stands={arc !== null && (from == null || inArc(from, arc))}
          disabled={!canDraw}
          onClear={clear}
        />
        <ConditionsWords>
          {canDraw && (
            <button
              type="button"
              className="pointer-coarse:min-h-11 min-h-6 cursor-pointer underline underline-offset-4"
              aria-expanded={typing}
              aria-controls={formId}
              onClick={() => setTyping(!typing)}
            >
              {typing ? 'Done' : 'Type in'}
              <span className="sr-only"> conditions</span>
            </button>
          )}
        </ConditionsWords>
      </div>
      <div
        id={formId}
        hidden={!typing}
        // Over the checks where the strip is a column: they must not be squeezed out of it.
        className="lg:absolute lg:inset-x-0 lg:top-full lg:z-20 lg:border-y lg:border-ink lg:bg-margin lg:px-4 lg:pb-4"
      >
        {typing && <ConditionsForm />}
      </div>
    </section>
  );
}
