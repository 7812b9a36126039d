'use client';

import type { Status } from '@/lib/checks';
import { StatusCount } from '@/components/ui/status-mark';
import type { StatusCounts } from './count-findings';
import type { Show } from './group-findings';

const SHOWN: readonly Status[] = ['not-met', 'not-known', 'caution', 'meets'];

/** How many of each, worst first; each count goes to the first of its kind. */
export function ChecksHead({
  counts,
  show,
  onGoTo,
  onShow,
}: {
  counts: StatusCounts;
  show: Show;
  onGoTo: (status: Status) => void;
  onShow: (show: Show) => void;
}) {
  const shown = SHOWN.filter((status) => counts[status] > 0);
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
      {shown.map((status) => (
        <button
          key={status}
          type="button"
          className="pointer-coarse:min-h-11 inline-flex min-h-8 cursor-pointer items-center"
          onClick={() => onGoTo(status)}
        >
          <StatusCount status={status} count={counts[status]} />
          <span className="sr-only">, go to the first</span>
        </button>
      ))}
      <label className="pointer-coarse:min-h-11 ml-auto inline-flex min-h-8 cursor-pointer items-center gap-2">
        <input
          type="checkbox"
          className="size-5 accent-[var(--action)]"
          checked={show === 'attention'}
          onChange={(event) => onShow(event.target.checked ? 'attention' : 'all')}
        />
        Only open
      </label>
    </div>
  );
}
