'use client';

import type { ReactNode } from 'react';
import type { Finding, Missing } from '@/lib/checks';
import { SlopeFields, WindFields } from '@/components/conditions/conditions-form';
import { useDrawing } from '@/lib/client/use-drawing';
import { whoMay } from '@/lib/access';
import { needsAttention } from '@/components/checks/count-findings';
import { KitChoice } from '@/components/kit/kit-choice';
import { LiquidFields } from '@/components/title-block/liquid-fields';
import { LocateFields } from './locate-fields';
import { NoneOverhead } from './none-overhead';
import { OwnerAnswer } from './owner-answer';
import { TakeInHand } from './take-in-hand';
import { Voltage } from './voltage';

const SHORT: Record<Missing, string> = {
  wind: 'wind',
  slope: 'slope',
  source: 'a source',
  'hot-zone': 'the hot zone',
  vent: 'the vent',
  liquid: 'the liquid',
  acceptance: 'acceptance',
  kit: 'the kit',
  'owner-answer': 'the answer',
  locate: 'a ticket',
  overhead: 'overhead lines',
  voltage: 'voltage',
  'buried-lines': 'buried lines',
  'test-line': 'the probes',
  rods: 'rods',
};

const DRAWN: ReadonlySet<Missing> = new Set([
  'source',
  'hot-zone',
  'vent',
  'buried-lines',
  'test-line',
  'rods',
]);

/** A single choice leaves room beside it. */
const WIDTH: Partial<Record<Missing, string>> = {
  'owner-answer': 'min-w-48 flex-1',
  kit: 'min-w-48 flex-1',
  voltage: 'min-w-40 flex-1',
};

const idOf = (what: Missing): string => `enter-${what}`;

/** Where something is not known, the field for it stands in the line; elsewhere, the way to it. */
export function EnterHere({
  finding,
  offered,
}: {
  finding: Finding;
  offered: ReadonlySet<Missing>;
}) {
  const canDraw = useDrawing((s) => s.canDraw);
  if (!needsAttention(finding.status) || !canDraw) return null;
  return finding.missing.map((what) =>
    offered.has(what) ? (
      <div key={what} id={idOf(what)} className={WIDTH[what] ?? (DRAWN.has(what) ? '' : 'w-full')}>
        {fieldFor(what, finding)}
      </div>
    ) : (
      <button
        key={what}
        type="button"
        className="pointer-coarse:min-h-11 min-h-8 cursor-pointer underline underline-offset-4"
        onClick={() => goToField(what)}
      >
        {DRAWN.has(what) ? 'Draw' : 'Enter'} {SHORT[what]}
      </button>
    ),
  );
}

function goToField(what: Missing): void {
  const field = document.getElementById(idOf(what));
  field?.scrollIntoView({ block: 'center' });
  field?.querySelector<HTMLElement>('input, select, button')?.focus();
}

function fieldFor(what: Missing, finding: Finding): ReactNode {
  switch (what) {
    case 'wind':
      return (
        <div className="grid grid-cols-2 gap-x-3 gap-y-1">
          <WindFields />
        </div>
      );
    case 'slope':
      return (
        <div className="grid grid-cols-2 gap-x-3 gap-y-1">
          <SlopeFields />
        </div>
      );
    case 'source':
      return <TakeInHand kinds={['release-point', 'pool']} />;
    case 'hot-zone':
      return <TakeInHand kinds={['hot-zone']} />;
    case 'vent':
      return <TakeInHand kinds={['vent']} />;
    case 'test-line':
      return <TakeInHand kinds={['z-probe', 'y-probe']} />;
    case 'rods':
      return <TakeInHand kinds={['rod']} />;
    case 'buried-lines':
      return <TakeInHand kinds={['buried-line']} />;
    case 'liquid':
      return <LiquidFields />;
    case 'acceptance':
      return <p>The agency sets it in its limits: {whoMay('limits.change')} may.</p>;
    case 'kit':
      return <KitChoice />;
    case 'owner-answer':
      return <OwnerAnswer subject={finding.subjects[0] ?? null} />;
    case 'locate':
      return <LocateFields />;
    case 'overhead':
      return <NoneOverhead />;
    case 'voltage':
      return <Voltage subjects={finding.subjects} />;
  }
}
