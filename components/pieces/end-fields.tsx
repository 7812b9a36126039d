'use client';

import { Field, Select } from '@/components/ui/field';
import { pieceName } from '@/components/drawing/piece-words';
import { useDrawing } from '@/lib/client/use-drawing';
import { mayJoin } from '@/lib/edits';
import { isRun, type Kind, type Run } from '@/lib/layout';

/** The two pieces that a cable, lead or hose joins; only such as it may join are offered. */
export function EndFields({
  kind,
  from,
  to,
  fault,
  onChange,
}: {
  kind: Kind;
  from: string;
  to: string;
  fault: string | undefined;
  onChange: (ends: { from?: string; to?: string }) => void;
}) {
  const sheet = useDrawing((s) => s.sheet);
  const choices = (end: 'from' | 'to') =>
    sheet.layout.pieces
      .filter((piece) => !isRun(piece) && mayJoin(kind as Run['kind'], end, piece))
      .map((piece) => ({ id: piece.id, name: pieceName(sheet, piece) }));
  return (
    <>
      {(['from', 'to'] as const).map((end) => (
        <Field
          key={end}
          label={end === 'from' ? 'From' : 'To'}
          error={end === 'to' ? fault : undefined}
          className="w-48"
        >
          {(ties) => (
            <Select
              {...ties}
              value={end === 'from' ? from : to}
              onChange={(event) => onChange({ [end]: event.target.value })}
            >
              <option value="">choose</option>
              {choices(end).map(({ id, name }) => (
                <option key={id} value={id}>
                  {name}
                </option>
              ))}
            </Select>
          )}
        </Field>
      ))}
    </>
  );
}
