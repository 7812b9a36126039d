'use client';

import { useState, type ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { fromLocalInput, toLocalInput } from './time-words';

/**
 * A date and time in the reader's zone, kept at Enter or on leaving the field, so that filling in
 * its parts is one change. "Now" enters the moment it is pressed.
 */
export function TimeEntry({
  label,
  value,
  disabled,
  className,
  onEnter,
}: {
  label: ReactNode;
  value: string | null | undefined;
  disabled: boolean;
  className?: string;
  onEnter: (at: string | null) => void;
}) {
  const [draft, setDraft] = useState<string | null>(null);
  const kept = toLocalInput(value);
  const enter = (): void => {
    if (draft !== null && draft !== kept) onEnter(fromLocalInput(draft));
    setDraft(null);
  };
  return (
    <Field label={label} className={className}>
      {(ties) => (
        <span className="flex gap-2">
          <Input
            {...ties}
            type="datetime-local"
            className="min-w-0 !px-2 !py-1"
            disabled={disabled}
            value={draft ?? kept}
            onChange={(event) => setDraft(event.target.value)}
            onBlur={enter}
            onKeyDown={(event) => {
              if (event.key === 'Enter') {
                event.preventDefault();
                enter();
              }
            }}
          />
          <Button
            disabled={disabled}
            onClick={() => {
              setDraft(null);
              onEnter(new Date().toISOString());
            }}
          >
            Now
          </Button>
        </span>
      )}
    </Field>
  );
}
