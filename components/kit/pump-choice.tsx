'use client';

import { Field, Select } from '@/components/ui/field';
import { useDrawing } from '@/lib/client/use-drawing';
import { PUMP_PLACES, type PumpPlace } from '@/lib/layout';

const WORDS: Record<PumpPlace, string> = {
  separate: 'stands by itself',
  'on-receiving-vehicle': 'on the receiver',
  none: 'none',
};

/** Where the pump is decides whether there is a third system. Not entered counts as by itself. */
export function PumpChoice({ className }: { className?: string }) {
  const pump = useDrawing((s) => s.sheet.layout.pump);
  const canDraw = useDrawing((s) => s.canDraw);
  const apply = useDrawing((s) => s.apply);
  return (
    <Field label="Pump" className={`!flex-row !items-center ${className ?? ''}`}>
      {(ties) => (
        <Select
          {...ties}
          className="pointer-coarse:!min-h-11 !min-h-7 !px-1 !py-0"
          disabled={!canDraw}
          value={pump ?? ''}
          onChange={(event) => {
            const place = PUMP_PLACES.find((one) => one === event.target.value) ?? null;
            apply(
              { type: 'set-layout', members: { pump: place } },
              place ? `Pump: ${WORDS[place]}` : 'Where the pump is, not known',
            );
          }}
        >
          <option value="">not known</option>
          {PUMP_PLACES.map((place) => (
            <option key={place} value={place}>
              {WORDS[place]}
            </option>
          ))}
        </Select>
      )}
    </Field>
  );
}
