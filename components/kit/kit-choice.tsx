'use client';

import { Field, Select } from '@/components/ui/field';
import { useDrawing } from '@/lib/client/use-drawing';

const NONE = '';
/** The layout keeps a copy of its kit; one that the agency no longer has stays as it was. */
const KEPT = 'kept';

/** Which kit the crew brings. The layout takes a copy, so that later changes to the kit don't. */
export function KitChoice({ className }: { className?: string }) {
  const kits = useDrawing((s) => s.meta.kits);
  const chosen = useDrawing((s) => s.sheet.layout.kit);
  const canDraw = useDrawing((s) => s.canDraw);
  const apply = useDrawing((s) => s.apply);
  const known = kits.find((kit) => kit.name === chosen?.name);
  const value = known?.id ?? (chosen ? KEPT : NONE);

  const choose = (id: string): void => {
    const kit = kits.find((one) => one.id === id);
    if (kit) {
      apply(
        { type: 'set-layout', members: { kit: { name: kit.name, items: kit.items } } },
        `Bring ${kit.name}`,
      );
    } else if (id === NONE) {
      apply({ type: 'set-layout', members: { kit: null } }, 'No kit chosen');
    }
  };

  return (
    <Field label={<span className="sr-only">Kit</span>} className={className}>
      {(ties) => (
        <Select
          {...ties}
          className="pointer-coarse:!min-h-11 !min-h-9 !px-1 !py-0.5"
          disabled={!canDraw}
          value={value}
          onChange={(event) => choose(event.target.value)}
        >
          <option value={NONE}>No kit chosen</option>
          {value === KEPT && <option value={KEPT}>{chosen?.name ?? 'Kit of the file'}</option>}
          {kits.map((kit) => (
            <option key={kit.id} value={kit.id}>
              {kit.name}
            </option>
          ))}
        </Select>
      )}
    </Field>
  );
}
