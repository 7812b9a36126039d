'use client';

import { Button } from '@/components/ui/button';
import { useDrawing } from '@/lib/client/use-drawing';
import { KIND_WORDS } from '@/lib/edits';
import { isSiteKind, type Kind } from '@/lib/layout';

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** Takes a piece in hand, to be placed on the plan next. */
export function TakeInHand({ kinds }: { kinds: readonly Kind[] }) {
  const take = useDrawing((s) => s.take);
  const inHand = useDrawing((s) => s.inHand);
  const canChangeSite = useDrawing((s) => s.canChangeSite);
  return (
    <span className="flex flex-wrap gap-2">
      {kinds
        .filter((kind) => canChangeSite || !isSiteKind(kind))
        .map((kind) => {
          const words = capital(KIND_WORDS[kind]);
          return (
            <Button
              key={kind}
              className="pointer-coarse:!min-h-11 !min-h-9 !px-3"
              aria-pressed={inHand?.kind === kind}
              onClick={() => take({ kind, words, members: {} })}
            >
              {inHand?.kind === kind ? `${words} in hand` : `Draw ${KIND_WORDS[kind]}`}
            </Button>
          );
        })}
    </span>
  );
}
