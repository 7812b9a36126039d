import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { fromLocalEntry, toLocalEntry } from '@/components/ui/local-time';
import { StatusMark } from '@/components/ui/status-mark';
import { When } from '@/components/ui/when';
import type { Locate, SiteGround } from '@/lib/layout';
import type { GroundDraft } from './ground-draft';

/** The locate tickets: number, from when work is lawful, until when they are good. */
export function LocatesList({
  ground,
  edit,
}: {
  ground: SiteGround;
  edit: ((part: Partial<GroundDraft>) => void) | null;
}) {
  const { locates } = ground;
  const put = (index: number, locate: Locate) =>
    edit?.({ locates: locates.map((old, i) => (i === index ? locate : old)) });
  return (
    <div className="border-b border-rule-faint py-2">
      <h3 className="font-bold">Locate tickets</h3>
      {locates.length === 0 && (
        <p className="py-1">
          <StatusMark status="not-known" className="font-semibold">
            No locate ticket is entered
          </StatusMark>
        </p>
      )}
      <ul>
        {locates.map((locate, index) =>
          edit ? (
            <li key={index} className="border-t border-rule-faint py-3 first:border-t-0">
              <LocateEntry
                locate={locate}
                put={(changed) => put(index, changed)}
                takeOut={() => edit({ locates: locates.filter((_, i) => i !== index) })}
              />
            </li>
          ) : (
            <li key={index} className="py-1">
              <LocateWords locate={locate} />
            </li>
          ),
        )}
      </ul>
      {edit && (
        <Button
          look="quiet"
          onClick={() => edit({ locates: [...locates, { ticket: '', emergency: false }] })}
        >
          Add a ticket
        </Button>
      )}
    </div>
  );
}

function LocateWords({ locate }: { locate: Locate }) {
  const { lawful_start, valid_until } = locate;
  return (
    <>
      <strong>{locate.ticket}</strong>
      {locate.emergency ? ', emergency: work may start at once' : ', work lawful from '}
      {!locate.emergency && (lawful_start ? <When at={lawful_start} /> : 'a time not entered')}
      {', valid until '}
      {valid_until ? <When at={valid_until} /> : 'a time not entered'}
    </>
  );
}

function LocateEntry({
  locate,
  put,
  takeOut,
}: {
  locate: Locate;
  put: (locate: Locate) => void;
  takeOut: () => void;
}) {
  return (
    <div className="flex flex-wrap items-end gap-3">
      <Field label="Ticket" className="w-44">
        {(ties) => (
          <Input
            {...ties}
            value={locate.ticket}
            maxLength={100}
            onChange={(event) => put({ ...locate, ticket: event.target.value })}
          />
        )}
      </Field>
      <Field label="Lawful start" className="w-56">
        {(ties) => (
          <Input
            {...ties}
            type="datetime-local"
            value={toLocalEntry(locate.lawful_start)}
            onChange={(event) =>
              put({ ...locate, lawful_start: fromLocalEntry(event.target.value) })
            }
          />
        )}
      </Field>
      <Field label="Valid until" className="w-56">
        {(ties) => (
          <Input
            {...ties}
            type="datetime-local"
            value={toLocalEntry(locate.valid_until)}
            onChange={(event) =>
              put({ ...locate, valid_until: fromLocalEntry(event.target.value) })
            }
          />
        )}
      </Field>
      <label className="inline-flex min-h-11 items-center gap-2">
        <input
          type="checkbox"
          className="size-5"
          checked={locate.emergency === true}
          onChange={(event) => put({ ...locate, emergency: event.target.checked })}
        />
        Emergency
      </label>
      <Button look="quiet" onClick={takeOut}>
        Take this ticket out
      </Button>
    </div>
  );
}
