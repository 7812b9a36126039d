'use client';

import { NumberEntry } from '@/components/conditions/number-entry';
import { useDrawing } from '@/lib/client/use-drawing';
import { findPiece, type PieceOf } from '@/lib/layout';

const MOST_VOLTS = 2_000_000;

/** Voltage of the overhead line among the subjects; its owner says it, nobody guesses it. */
export function Voltage({ subjects }: { subjects: readonly string[] }) {
  const line = useDrawing(
    (s) =>
      subjects
        .map((id) => findPiece(s.sheet, id))
        .find((piece): piece is PieceOf<'overhead-line'> => piece?.kind === 'overhead-line') ??
      null,
  );
  const disabled = !useDrawing((s) => s.canChangeSite);
  const apply = useDrawing((s) => s.apply);
  if (!line) return null;
  return (
    <NumberEntry
      label="Voltage, as its owner says"
      unit="V"
      value={line.volts}
      decimals={0}
      least={0}
      most={MOST_VOLTS}
      disabled={disabled}
      onEnter={(volts) =>
        apply(
          { type: 'set-piece', id: line.id, members: { volts } },
          volts === null ? 'Voltage not known' : `Overhead line carries ${volts} V`,
        )
      }
    />
  );
}
