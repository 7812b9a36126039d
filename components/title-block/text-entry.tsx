'use client';

import { useState, type ReactNode } from 'react';
import { Field, Input } from '@/components/ui/field';

/** A word typed in and kept at Enter or on leaving the field; emptied, it is not entered. */
export function TextEntry({
  label,
  value,
  most,
  disabled,
  onEnter,
}: {
  label: ReactNode;
  value: string | null | undefined;
  most: number;
  disabled: boolean;
  onEnter: (value: string | null) => void;
}) {
  const [draft, setDraft] = useState<string | null>(null);
  const enter = (): void => {
    if (draft === null) return;
    const written = draft.trim() === '' ? null : draft.trim();
    setDraft(null);
    if (written !== (value ?? null)) onEnter(written);
  };
  return (
    <Field label={label}>
      {(ties) => (
        <Input
          {...ties}
          className="min-w-0 !px-2 !py-1"
          placeholder="not known"
          autoComplete="off"
          maxLength={most}
          disabled={disabled}
          value={draft ?? value ?? ''}
          onChange={(event) => setDraft(event.target.value)}
          onBlur={enter}
          onKeyDown={(event) => {
            if (event.key === 'Enter') {
              event.preventDefault();
              enter();
            }
          }}
        />
      )}
    </Field>
  );
}
