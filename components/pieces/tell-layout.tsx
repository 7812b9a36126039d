'use client';

import { useId, useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { useDrawing } from '@/lib/client/use-drawing';
import { describeLayout } from '@/lib/layout/describe';

/** The layout in ordered sentences, to be read out. */
export function TellLayout() {
  const [open, setOpen] = useState(false);
  const id = useId();
  return (
    <div>
      <Button aria-expanded={open} aria-controls={id} onClick={() => setOpen(!open)}>
        {open ? 'Put the description away' : 'Describe the layout'}
      </Button>
      <div id={id} hidden={!open}>
        {open && <Sentences />}
      </div>
    </div>
  );
}

function Sentences() {
  const sheet = useDrawing((s) => s.sheet);
  const sentences = useMemo(() => describeLayout(sheet), [sheet]);
  return (
    <ol className="mt-2 max-w-[72ch] list-decimal space-y-1 pl-6">
      {sentences.map((sentence) => (
        <li key={sentence}>{sentence}</li>
      ))}
    </ol>
  );
}
