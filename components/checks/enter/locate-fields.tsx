'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { fromLocalInput } from '@/components/conditions/time-words';
import { useDrawing, useDrawingStore } from '@/lib/client/use-drawing';

/** A locate ticket as the one-call centre gave it. */
export function LocateFields() {
  const store = useDrawingStore();
  const canChangeSite = useDrawing((s) => s.canChangeSite);
  const [error, setError] = useState<string | undefined>(undefined);

  const add = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const text = (name: string): string => String(form.get(name) ?? '').trim();
    const ticket = text('ticket');
    const { history, apply } = store.getState();
    const { locates } = history.present.site;
    if (ticket === '') return setError('Enter the number of the ticket');
    if (locates.some((locate) => locate.ticket === ticket)) {
      return setError(`Ticket ${ticket} is recorded already`);
    }
    setError(undefined);
    const locate = {
      ticket,
      lawful_start: fromLocalInput(text('start')),
      valid_until: fromLocalInput(text('until')),
      emergency: form.get('emergency') !== null,
    };
    apply({ type: 'set-ground', locates: [...locates, locate] }, `Record ticket ${ticket}`);
  };

  if (!canChangeSite) return null;
  return (
    <form onSubmit={add} noValidate className="grid grid-cols-2 items-end gap-x-3 gap-y-1">
      <Field label="Ticket" error={error}>
        {(ties) => <Input {...ties} name="ticket" className="!py-1" autoComplete="off" />}
      </Field>
      <label className="flex min-h-11 items-center gap-2">
        <input type="checkbox" name="emergency" className="size-5 accent-[var(--action)]" />
        Emergency ticket
      </label>
      <Field label="Lawful start">
        {(ties) => <Input {...ties} name="start" type="datetime-local" className="!px-1 !py-1" />}
      </Field>
      <Field label="Valid until">
        {(ties) => <Input {...ties} name="until" type="datetime-local" className="!px-1 !py-1" />}
      </Field>
      <Button type="submit" className="col-span-2">
        Record the ticket
      </Button>
    </form>
  );
}
