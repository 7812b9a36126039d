'use client';

import { useRef, useState, type ReactNode } from 'react';
import { Input } from '@/components/ui/field';

/**
 * Words that can be written over where they stand: press, type, Enter. Escape leaves them as they
 * were; emptied, they are not entered any more.
 */
export function InPlace({
  name,
  value,
  shown,
  most,
  disabled,
  className = '',
  onEnter,
}: {
  name: string;
  value: string | null | undefined;
  /** What stands there while nobody writes. */
  shown: ReactNode;
  most: number;
  disabled: boolean;
  className?: string;
  onEnter: (value: string | null) => void;
}) {
  const [draft, setDraft] = useState<string | null>(null);
  const back = useRef<HTMLButtonElement>(null);
  if (disabled) return <span className={className}>{shown}</span>;

  const close = (): void => {
    setDraft(null);
    // Once the field is gone, the keyboard goes on from where it was.
    requestAnimationFrame(() => back.current?.focus());
  };
  const enter = (): void => {
    if (draft === null) return;
    const written = draft.trim() === '' ? null : draft.trim();
    if (written !== (value ?? null)) onEnter(written);
  };

  if (draft !== null) {
    return (
      <Input
        autoFocus
        aria-label={name}
        maxLength={most}
        className={`pointer-coarse:!min-h-11 !min-h-9 !px-1 !py-0 ${className}`}
        value={draft}
        onChange={(event) => setDraft(event.target.value)}
        onFocus={(event) => event.target.select()}
        onBlur={() => {
          enter();
          setDraft(null);
        }}
        onKeyDown={(event) => {
          if (event.key === 'Enter') close();
          if (event.key === 'Enter') enter();
          if (event.key === 'Escape') {
            event.stopPropagation();
            close();
          }
        }}
      />
    );
  }
  return (
    <button
      ref={back}
      type="button"
      aria-label={`${name}: ${value ?? 'not entered'}. Change`}
      onClick={() => setDraft(value ?? '')}
      className={`pointer-coarse:min-h-11 min-h-7 cursor-text text-left decoration-rule decoration-dotted underline-offset-4 hover:underline ${className}`}
    >
      {shown}
    </button>
  );
}
