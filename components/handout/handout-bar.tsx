'use client';

import Link from 'next/link';
import { usePathname, useRouter } from 'next/navigation';
import { useId, type ReactNode } from 'react';
import { Select } from '@/components/ui/field';
import { PrintButton } from '@/components/ui/print-button';
import type { LengthUnit } from '@/lib/draw';
// Not through the index: a menu must not bring the whole drawing to the browser.
import { PAPERS, SCALES } from '@/lib/draw/paper';
import type { HandoutChoice } from './handout-choice';

const MEASURES: Record<LengthUnit, string> = { ft: 'Feet', m: 'Metres' };

/** What the handout is printed on and how large; kept in the address, so that it can be sent on. */
export function HandoutBar({ layoutId, choice }: { layoutId: string; choice: HandoutChoice }) {
  const router = useRouter();
  const path = usePathname();
  const choose = (change: Partial<Record<'paper' | 'units' | 'scale', string>>): void => {
    const asked = new URLSearchParams({
      paper: choice.paper,
      units: choice.units,
      ...(choice.scale && { scale: choice.scale.id }),
      ...change,
    });
    // A scale belongs to its measure.
    if (change.units || asked.get('scale') === '') asked.delete('scale');
    router.replace(`${path}?${asked}`, { scroll: false });
  };
  return (
    <div className="mb-6 flex flex-wrap items-end gap-x-5 gap-y-3 print:hidden">
      <Choice label="Paper" value={choice.paper} onChoose={(paper) => choose({ paper })}>
        {Object.entries(PAPERS).map(([id, { name }]) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </Choice>
      <Choice label="Measures" value={choice.units} onChoose={(units) => choose({ units })}>
        {Object.entries(MEASURES).map(([id, name]) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </Choice>
      <Choice label="Scale" value={choice.scale?.id ?? ''} onChoose={(scale) => choose({ scale })}>
        <option value="">Largest that fits</option>
        {SCALES[choice.units].map(({ id, words }) => (
          <option key={id} value={id}>
            {words}
          </option>
        ))}
      </Choice>
      <PrintButton>Print</PrintButton>
      <Link
        href={`/layouts/${layoutId}`}
        className="inline-flex min-h-11 items-center underline underline-offset-4"
      >
        Back to the drawing
      </Link>
    </div>
  );
}

function Choice({
  label,
  value,
  onChoose,
  children,
}: {
  label: string;
  value: string;
  onChoose: (value: string) => void;
  children: ReactNode;
}) {
  const id = useId();
  return (
    <div className="min-w-36">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      <Select id={id} value={value} onChange={(event) => onChoose(event.target.value)}>
        {children}
      </Select>
    </div>
  );
}
