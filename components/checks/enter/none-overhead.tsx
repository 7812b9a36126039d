'use client';

import { Button } from '@/components/ui/button';
import { useDrawing } from '@/lib/client/use-drawing';
import { TakeInHand } from './take-in-hand';

/** Somebody looked up and there is none, or there is one to draw. */
export function NoneOverhead() {
  const apply = useDrawing((s) => s.apply);
  const canChangeSite = useDrawing((s) => s.canChangeSite);
  if (!canChangeSite) return null;
  return (
    <span className="flex flex-wrap gap-2">
      <Button
        className="pointer-coarse:!min-h-11 !min-h-9 !px-3"
        onClick={() =>
          apply(
            { type: 'set-ground', overhead_none_known_as_of: new Date().toISOString() },
            'Record that no overhead line is known',
          )
        }
      >
        Looked up now: none
      </Button>
      <TakeInHand kinds={['overhead-line']} />
    </span>
  );
}
