'use client';

import { useId, useMemo, useState, type ReactNode } from 'react';
import { countFindings, verdictWords } from '@/components/checks/count-findings';
import { NotEntered } from '@/components/conditions/not-entered';
import { TimeEntry } from '@/components/conditions/time-entry';
import { dateTimeWords } from '@/components/conditions/time-words';
import { Caution } from '@/components/ui/caution';
import { StatusShape } from '@/components/ui/status-mark';
import { useDrawing } from '@/lib/client/use-drawing';
import { InPlace } from './in-place';
import { LiquidFields } from './liquid-fields';
import { liquidWords } from './liquid-words';
import { ScaleBar } from './scale-bar';

const NAME_MOST = 200;

/**
 * The title block, bottom right as on any sheet: what it is, whose, for which liquid and limit,
 * who drew it and how far it has come.
 */
export function TitleBlock({
  metresPerPx = null,
  field = false,
}: {
  /** Ground metres of one screen pixel of the plan at this moment. */
  metresPerPx?: number | null;
  /** On a screen that is used near the work. */
  field?: boolean;
}) {
  const layout = useDrawing((s) => s.sheet.layout);
  const meta = useDrawing((s) => s.meta);
  const acceptance = useDrawing((s) => s.limits.acceptance);
  const canDraw = useDrawing((s) => s.canDraw);
  const apply = useDrawing((s) => s.apply);
  const [editing, setEditing] = useState<'liquid' | 'time' | null>(null);
  const editorId = useId();
  const toggle = (what: 'liquid' | 'time'): void => setEditing(editing === what ? null : what);

  return (
    <section aria-label="Title block" className="relative border-t-2 border-ink bg-paper">
      <div className="flex items-baseline justify-between gap-3 border-b border-ink px-3 py-1.5">
        <h2 className="min-w-0 text-lg font-bold leading-tight">
          <InPlace
            name="Name of the layout"
            value={layout.name}
            shown={layout.name ?? 'Not named yet'}
            most={NAME_MOST}
            disabled={!canDraw}
            onEnter={(name) =>
              apply(
                { type: 'set-layout', members: { name } },
                name ? `Name it “${name}”` : 'Take its name away',
              )
            }
          />
        </h2>
        <p className="shrink-0 text-lg font-bold leading-tight text-alarm">DRAFT</p>
      </div>
      <Verdict field={field} />
      <dl className="grid grid-cols-[1.7fr_1fr_1fr] text-[15px] leading-tight">
        <Cell label="Liquid" className="col-span-2">
          <Change
            words={liquidWords(layout.liquid)}
            lack="not known"
            disabled={!canDraw}
            open={editing === 'liquid'}
            controls={editorId}
            onToggle={() => toggle('liquid')}
          />
        </Cell>
        <Cell label="Accept below">
          {acceptance ? (
            <strong className="text-lg leading-tight">{acceptance.max_ohm} Ω</strong>
          ) : (
            <NotEntered>not set</NotEntered>
          )}
        </Cell>
        <Cell label="Drawn by">{meta.drawnBy ?? '–'}</Cell>
        <Cell label="Checked by">–</Cell>
        <Cell label="Revision">draft</Cell>
        <Cell label={meta.agencyName} className={metresPerPx === null ? 'col-span-3' : ''}>
          <Change
            words={layout.planned_at ? dateTimeWords(layout.planned_at) : null}
            lack="start not planned"
            disabled={!canDraw}
            open={editing === 'time'}
            controls={editorId}
            onToggle={() => toggle('time')}
          />
        </Cell>
        {metresPerPx !== null && (
          <div className="col-span-2 border-b border-ink px-3 py-1">
            <dt className="sr-only">Scale</dt>
            <dd>
              <ScaleBar metresPerPx={metresPerPx} />
            </dd>
          </div>
        )}
      </dl>
      <div
        id={editorId}
        hidden={editing === null}
        // Over the checks where the strip is a column: they must not be squeezed out of it.
        className="border-t border-ink px-3 py-2 lg:absolute lg:inset-x-0 lg:bottom-full lg:z-20 lg:border-b lg:bg-paper lg:pb-4"
      >
        <div className="flex justify-end">
          <button
            type="button"
            className="pointer-coarse:min-h-11 min-h-8 cursor-pointer underline underline-offset-4"
            onClick={() => setEditing(null)}
          >
            Done
          </button>
        </div>
        {editing === 'liquid' && <LiquidFields />}
        {editing === 'time' && (
          <TimeEntry
            label="Planned start"
            value={layout.planned_at}
            disabled={!canDraw}
            onEnter={(planned_at) =>
              apply(
                { type: 'set-layout', members: { planned_at } },
                planned_at ? `Plan the start ${dateTimeWords(planned_at)}` : 'Start not planned',
              )
            }
          />
        )}
      </div>
    </section>
  );
}

function Cell({
  label,
  className = '',
  children,
}: {
  label: string;
  className?: string;
  children: ReactNode;
}) {
  return (
    <div
      className={`min-w-0 border-b border-r border-ink px-3 py-1 last-of-type:border-r-0 ${className}`}
    >
      <dt className="truncate text-sm leading-tight text-ink-soft">{label}</dt>
      <dd>{children}</dd>
    </div>
  );
}

function Change({
  words,
  lack,
  disabled,
  open,
  controls,
  onToggle,
}: {
  words: string | null;
  lack: string;
  disabled: boolean;
  open: boolean;
  controls: string;
  onToggle: () => void;
}) {
  const shown = words ?? <NotEntered>{lack}</NotEntered>;
  if (disabled) return shown;
  return (
    <button
      type="button"
      aria-expanded={open}
      aria-controls={controls}
      onClick={onToggle}
      className="pointer-coarse:min-h-11 min-h-6 cursor-pointer text-left decoration-rule decoration-dotted underline-offset-4 hover:underline"
    >
      {shown}
      <span className="sr-only">, change</span>
    </button>
  );
}

/** Said only when every check answered and none asks for anything; never without the caution. */
function Verdict({ field }: { field: boolean }) {
  const findings = useDrawing((s) => s.findings);
  const agency = useDrawing((s) => s.meta.agencyName);
  const words = useMemo(() => verdictWords(countFindings(findings), agency), [findings, agency]);
  if (!words) return null;
  return (
    <div className="border-b border-ink px-3 py-1.5">
      <p className="text-lg font-bold leading-tight text-spruce">
        <StatusShape status="meets" /> {words}
      </p>
      <Caution field={field} className="pt-1 text-sm leading-tight" />
    </div>
  );
}
