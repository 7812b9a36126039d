'use client';

import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  sortFn_alphanumeric,
  tableFeatures,
} from '@tanstack/react-table';
import { StatusMark } from '@/components/ui/status-mark';
import { rankOf } from '@/components/checks/count-findings';
import { formatPosition, threeDigits } from '@/lib/geo';
import type { PieceRow } from './piece-rows';

export const features = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric },
});

const column = createColumnHelper<typeof features, PieceRow>();

export const columns = column.columns([
  column.accessor('name', { header: 'Piece', sortFn: 'alphanumeric' }),
  column.accessor('kind', { header: 'Kind', sortFn: 'alphanumeric' }),
  column.accessor('system', { header: 'System', sortFn: 'alphanumeric' }),
  column.accessor('bearingDeg', {
    header: 'Bearing',
    cell: ({ getValue }) => `${threeDigits(getValue())}°`,
  }),
  column.accessor('feet', {
    header: 'Distance',
    cell: ({ getValue }) => `${getValue().toFixed(1)} ft`,
  }),
  column.accessor((row) => row.at[1], {
    id: 'at',
    header: 'Latitude, longitude',
    cell: ({ row }) => formatPosition(row.original.at, 'decimal'),
  }),
  column.accessor((row) => rankOf(row.worst), {
    id: 'worst',
    header: 'Status',
    cell: ({ row }) => (
      <>
        <StatusMark status={row.original.worst} className="whitespace-nowrap">
          {row.original.worst === 'n/a' ? 'no check' : undefined}
        </StatusMark>
        {row.original.worstWords && <span className="block">{row.original.worstWords}</span>}
      </>
    ),
  }),
]);
