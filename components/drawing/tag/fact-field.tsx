'use client';

import { useId, useState, type KeyboardEvent, type ReactNode } from 'react';
import { parseNumber } from '@/components/conditions/parse-number';
import { SYSTEMS, type System } from '@/lib/layout';
import type { Fact } from './facts';

const CONTROL =
  'min-h-8 w-full min-w-0 border border-rule bg-paper px-1.5 hover:border-ink aria-invalid:border-2 aria-invalid:border-alarm disabled:border-dashed pointer-coarse:min-h-11';

type Props = {
  fact: Fact;
  value: unknown;
  disabled: boolean;
  /** `null` makes it not entered. */
  onEnter: (value: unknown) => void;
};

/** One fact on the tag: name at the left, what is entered at the right. */
export function FactField({ fact, ...rest }: Props) {
  switch (fact.type) {
    case 'number':
    case 'text':
      return <Typed fact={fact} {...rest} />;
    case 'choice':
      return (
        <Row label={fact.label}>
          {(id) => (
            <select
              id={id}
              className={`${CONTROL} cursor-pointer`}
              disabled={rest.disabled}
              value={typeof rest.value === 'string' ? rest.value : ''}
              onChange={(event) => rest.onEnter(event.target.value || null)}
            >
              {fact.open !== undefined && <option value="">{fact.open}</option>}
              {fact.choices.map(({ value, words }) => (
                <option key={value} value={value}>
                  {words}
                </option>
              ))}
            </select>
          )}
        </Row>
      );
    case 'flag':
      return (
        <Row label={fact.label}>
          {(id) => (
            <input
              id={id}
              type="checkbox"
              className="size-6 accent-[var(--action)]"
              disabled={rest.disabled}
              checked={rest.value === true}
              onChange={(event) => rest.onEnter(event.target.checked || null)}
            />
          )}
        </Row>
      );
    case 'systems':
      return <Systems fact={fact} {...rest} />;
  }
}

function Row({
  label,
  error,
  children,
}: {
  label: string;
  error?: string | null;
  children: (id: string) => ReactNode;
}) {
  const id = useId();
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="block text-sm leading-tight">
        {label}
      </label>
      <div className="flex min-w-0 items-center gap-1">{children(id)}</div>
      {error && (
        <p
          id={`${id}-error`}
          role="alert"
          className="text-sm font-semibold leading-tight text-alarm"
        >
          {error}
        </p>
      )}
    </div>
  );
}

function Typed({
  fact,
  value,
  disabled,
  onEnter,
}: Props & { fact: Extract<Fact, { type: 'number' | 'text' }> }) {
  const [draft, setDraft] = useState<string | null>(null);
  const [error, setError] = useState<string | null>(null);
  const kept = value === undefined || value === null ? '' : String(value);
  const drop = (): void => {
    setDraft(null);
    setError(null);
  };

  const enter = (): void => {
    if (draft === null || draft.trim() === kept) {
      drop();
      return;
    }
    if (fact.type === 'text') {
      drop();
      onEnter(draft.trim() || null);
      return;
    }
    const read = parseNumber(draft, fact.least, fact.most);
    if ('fault' in read) {
      setError(read.fault);
      return;
    }
    drop();
    onEnter(read.value);
  };

  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.key === 'Enter') {
      event.preventDefault();
      enter();
    } else if (event.key === 'Escape' && draft !== null) {
      event.stopPropagation();
      drop();
    }
  };

  return (
    <Row label={fact.label} error={error}>
      {(id) => (
        <>
          <input
            id={id}
            className={CONTROL}
            aria-invalid={error ? true : undefined}
            aria-describedby={error ? `${id}-error` : undefined}
            autoComplete="off"
            inputMode={fact.type === 'number' ? 'decimal' : undefined}
            maxLength={fact.type === 'text' ? fact.most : undefined}
            placeholder={placeholderOf(fact)}
            disabled={disabled}
            value={draft ?? kept}
            onChange={(event) => setDraft(event.target.value)}
            onBlur={enter}
            onKeyDown={onKeyDown}
          />
          {fact.type === 'number' && <span className="shrink-0">{fact.unit}</span>}
        </>
      )}
    </Row>
  );
}

function placeholderOf(fact: Extract<Fact, { type: 'number' | 'text' }>): string {
  if (fact.type === 'text') return 'none';
  return fact.standsFor === undefined ? 'not known' : `${fact.standsFor} taken`;
}

function Systems({ fact, value, disabled, onEnter }: Props) {
  const chosen = Array.isArray(value) ? (value as System[]) : null;
  const toggle = (system: System): void => {
    const now = chosen ?? [...SYSTEMS];
    const next = SYSTEMS.filter((s) => (s === system ? !now.includes(s) : now.includes(s)));
    onEnter(next.length === SYSTEMS.length ? null : next);
  };
  return (
    <fieldset className="col-span-full">
      <legend className="text-sm leading-tight">{fact.label}</legend>
      <div className="flex gap-3">
        {SYSTEMS.map((system) => (
          <label
            key={system}
            className="pointer-coarse:min-h-11 inline-flex min-h-8 items-center gap-1.5"
          >
            <input
              type="checkbox"
              className="size-6 accent-[var(--action)]"
              disabled={disabled}
              checked={chosen === null || chosen.includes(system)}
              onChange={() => toggle(system)}
            />
            {system}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
