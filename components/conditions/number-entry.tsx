'use client';

import { useState, type ReactNode } from 'react';
import { Field, Input } from '@/components/ui/field';
import { parseNumber } from './parse-number';

/**
 * A number typed in and kept at Enter or on leaving the field; emptied, it is not entered any more.
 * What can't be a number stays in the field with a sentence, and nothing is changed.
 */
export function NumberEntry({
  label,
  value,
  decimals = 2,
  least = -Infinity,
  most = Infinity,
  unit,
  disabled = false,
  className,
  onEnter,
}: {
  label: ReactNode;
  value: number | null | undefined;
  decimals?: number;
  least?: number;
  most?: number;
  unit?: ReactNode;
  disabled?: boolean;
  className?: string;
  onEnter: (value: number | null) => void;
}) {
  const [draft, setDraft] = useState<string | null>(null);
  const [error, setError] = useState<string | undefined>(undefined);
  const kept = value == null ? '' : String(Number(value.toFixed(decimals)));

  const enter = (): void => {
    if (draft === null) return;
    const read = parseNumber(draft, least, most);
    if ('fault' in read) {
      setError(read.fault);
      return;
    }
    setDraft(null);
    setError(undefined);
    if (draft.trim() !== kept) onEnter(read.value);
  };

  const drop = (): void => {
    setDraft(null);
    setError(undefined);
  };

  return (
    <Field label={label} error={error} className={className}>
      {(ties) => (
        <span className="flex items-center gap-1.5">
          <Input
            {...ties}
            inputMode="decimal"
            autoComplete="off"
            className="min-w-0 !px-2 !py-1"
            placeholder="not known"
            disabled={disabled}
            value={draft ?? kept}
            onChange={(event) => setDraft(event.target.value)}
            onBlur={enter}
            onKeyDown={(event) => {
              if (event.key === 'Enter') {
                event.preventDefault();
                enter();
              }
              if (event.key === 'Escape' && draft !== null) {
                event.stopPropagation();
                drop();
              }
            }}
          />
          {unit && <span className="shrink-0">{unit}</span>}
        </span>
      )}
    </Field>
  );
}
